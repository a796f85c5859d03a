import type { Order } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { countText, moneyText, unitPriceText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** What was agreed; nothing for those who get no prices. */
export function OrderFigures({ order }: { order: Order }) {
  const { currency } = useWorkshop();
  const { priceEach, goodsTotal, toolingCharge, charges = [], total } = order;
  if (
    priceEach === undefined ||
    goodsTotal === undefined ||
    toolingCharge === undefined ||
    total === undefined
  )
    return null;
  return (
    <Card title="What was agreed" subtitle={`In ${currency}, before tax`}>
      <KeyFigures
        figures={[
          { word: 'Price each', figure: unitPriceText(priceEach) },
          { word: `${countText(order.quantity)} pieces`, figure: moneyText(goodsTotal) },
          toolingFigure(toolingCharge),
          ...charges.map(({ name, amount }) => ({ word: name, figure: moneyText(amount) })),
          { word: 'Total', figure: moneyText(total) },
        ]}
      />
    </Card>
  );
}

/** A reorder has no tooling to pay: said, so that a nought does not look forgotten. */
function toolingFigure(charge: string) {
  if (Number(charge) > 0)
    return { word: 'Tooling', figure: moneyText(charge), note: 'charged once' };
  return { word: 'Tooling', figure: 'none', note: 'nothing new was made for it' };
}
