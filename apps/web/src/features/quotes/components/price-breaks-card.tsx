import type { BreakNumbers, RunNumbers } from '@hidewright/domain';
import { Card } from '../../../components/card.tsx';
import { KeyFigures, type KeyFigure } from '../../../components/key-figures.tsx';
import { Notice } from '../../../components/notice.tsx';
import { PriceLadder } from '../../../components/price-ladder.tsx';
import {
  countText,
  hoursText,
  moneyText,
  percentText,
  unitPriceText,
} from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

interface PriceBreaksCardProps {
  numbers: RunNumbers;
  target: string;
  chosen: number;
  onChoose: (quantity: number) => void;
}

/** The ladder, what to be careful of, and the chosen rung in figures. */
export function PriceBreaksCard({ numbers, target, chosen, onChoose }: PriceBreaksCardProps) {
  const { currency } = useWorkshop();
  const rungs = numbers.breaks.map((rung) => ({ ...rung, unitPrice: rung.priceEach }));
  return (
    <Card title="Price breaks" subtitle={`what is left per hour, in ${currency}`}>
      <PriceLadder
        rungs={rungs}
        target={target}
        currency={currency}
        chosen={chosen}
        onChoose={onChoose}
      />
      <p className="mt-2 text-sm text-ink-soft">
        Bench: left after everything bought, by bench hours. All in, the mark on the rung: after
        wages and overhead too, by all hours, desk time and packing included. Margin: what remains
        of the total after all costs.
      </p>
      <TypedPrices numbers={numbers} />
      <Warnings numbers={numbers} />
      <ChosenRung numbers={numbers} chosen={chosen} />
    </Card>
  );
}

/** Where the owner set the price, with what would have been worked out. */
function TypedPrices({ numbers }: Pick<PriceBreaksCardProps, 'numbers'>) {
  const typed = numbers.breaks.filter((rung) => rung.typed);
  if (typed.length === 0) return null;
  return (
    <p className="mt-2 text-sm text-ink-soft">
      {`Your own price at ${typed
        .map(
          (rung) =>
            `${countText(rung.quantity)} (worked out: ${unitPriceText(rung.suggestedPrice)})`,
        )
        .join(', ')}.`}
    </p>
  );
}

/** From where on a larger order costs less; where that is so for the rung itself, it is among its warnings. */
function cheaperWords(
  { quantity, priceEach, cheaperFrom, cheaperQuantity }: BreakNumbers,
  later: readonly BreakNumbers[],
): string[] {
  const cheaper = later.find((rung) => rung.quantity === cheaperQuantity) ?? later[0];
  if (cheaper === undefined || cheaperFrom === null || cheaperFrom <= quantity) return [];
  return [
    `From ${countText(cheaperFrom)} pieces at ${unitPriceText(priceEach)} on, ${countText(cheaper.quantity)} at ${unitPriceText(cheaper.priceEach)} cost less.`,
  ];
}

function Warnings({ numbers }: Pick<PriceBreaksCardProps, 'numbers'>) {
  const losing = numbers.breaks.some((rung) => rung.loses);
  const sentences = [
    ...numbers.warnings,
    ...numbers.breaks.flatMap((rung) => rung.warnings),
    ...numbers.breaks.flatMap((rung, at) => cheaperWords(rung, numbers.breaks.slice(at + 1))),
  ];
  if (sentences.length === 0) return null;
  return (
    <Notice tone={losing ? 'danger' : 'attention'} className="mt-3">
      <ul className="inline-block space-y-1 align-top">
        {sentences.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </Notice>
  );
}

function ChosenRung({ numbers, chosen }: Pick<PriceBreaksCardProps, 'numbers' | 'chosen'>) {
  const rung = numbers.breaks.find((each) => each.quantity === chosen);
  if (!rung) return null;
  const beside = [
    ...(Number(rung.toolingCharge) > 0 ? [`tooling ${moneyText(rung.toolingCharge)}`] : []),
    ...rung.charges.map(({ name, amount }) => `${name.toLowerCase()} ${moneyText(amount)}`),
  ];
  return (
    <div className="mt-4">
      <KeyFigures
        figures={[
          {
            word: `${countText(rung.quantity)} come to`,
            figure: moneyText(rung.total),
            note: beside.length > 0 ? `${beside.join(', ')} of it` : undefined,
          },
          {
            word: 'margin',
            figure: percentText(rung.marginPercent),
            note: 'after wages and desk time',
          },
          { word: 'left', figure: moneyText(rung.left), note: 'after everything bought' },
          {
            word: 'bench time',
            figure: hoursText(rung.benchMinutes),
            note: `all hours ${hoursText(rung.allMinutes)}`,
          },
          ...againAndSoldOn(rung),
        ]}
      />
    </div>
  );
}

/** The same order a second time, and what the customer makes of it. */
function againAndSoldOn(rung: BreakNumbers): KeyFigure[] {
  return [
    ...(Number(rung.toolingCharge) > 0
      ? [{ word: 'a later order', figure: moneyText(rung.reorderTotal), note: 'tooling paid for' }]
      : []),
    ...(rung.resaleMarginPercent === null
      ? []
      : [
          {
            word: 'sold on',
            figure: percentText(rung.resaleMarginPercent),
            note: 'of its price stays with the shop that sells it',
          },
        ]),
  ];
}
