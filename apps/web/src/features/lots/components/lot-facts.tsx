import type { Lot } from '@hidewright/contract';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { rackAreaText, dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

const given = (text: string) => (text === '' ? '–' : text);

/** What is left of a lot, large; then where it lies and where it came from. */
export function LotFacts({ lot }: { lot: Lot }) {
  const workshop = useWorkshop();
  const { currency, today } = workshop;
  const area = (areaMm2: string) => rackAreaText(areaMm2, workshop);
  const costs = [
    { word: `Cost, ${currency}`, figure: lot.cost },
    { word: `Left at cost, ${currency}`, figure: lot.valueOnHand },
  ].flatMap(({ word, figure }) =>
    figure === undefined ? [] : [{ word, figure: moneyText(figure) }],
  );
  return (
    <div className="space-y-5">
      <KeyFigures
        large
        figures={[
          {
            word: 'On hand',
            figure: area(lot.onHandAreaMm2),
            note: `of ${area(lot.measuredAreaMm2)} measured`,
          },
          { word: 'Held for jobs', figure: area(lot.reservedAreaMm2) },
          { word: 'Free', figure: area(lot.freeAreaMm2) },
        ]}
      />
      <KeyFigures
        figures={[
          {
            word: 'Leather',
            figure: (
              <TextLink to={`/stockroom/leather/${lot.leatherId}`}>{lot.leatherName}</TextLink>
            ),
          },
          { word: 'Place', figure: given(lot.place) },
          { word: 'Shade', figure: given(lot.shade) },
          { word: 'Grade', figure: given(lot.grade) },
          { word: 'Supplier’s lot', figure: given(lot.supplierLot) },
          { word: 'Received', figure: dayText(lot.receivedOn, today) },
          { word: 'Order', figure: <OrderLink lot={lot} /> },
          ...costs,
        ]}
      />
    </div>
  );
}

function OrderLink({ lot }: { lot: Lot }) {
  if (lot.purchaseOrderId === null) return '–';
  return (
    <TextLink to={`/stockroom/purchase-orders/${lot.purchaseOrderId}`}>
      {lot.purchaseOrderNumber}
    </TextLink>
  );
}
