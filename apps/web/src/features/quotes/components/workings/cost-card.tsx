import { hourlyKinds, type BreakNumbers } from '@hidewright/domain';
import { Card } from '../../../../components/card.tsx';
import { Waterfall, type WaterfallLine } from '../../../../components/waterfall.tsx';
import { countText, moneyText, unitPriceText } from '../../../../lib/formatting.ts';
import { useWorkshop } from '../../../../lib/workshop.tsx';
import { profitOf } from './profit.ts';

const right = 'py-1.5 pl-3 text-right align-top';

/** From what the order brings to what remains of it, each cost with how it was worked out. */
export function CostCard({ rung }: { rung: BreakNumbers }) {
  const { currency } = useWorkshop();
  return (
    <Card
      title={`The whole run of ${countText(rung.quantity)}`}
      subtitle={`in ${currency}; a piece costs ${unitPriceText(rung.unitCost)} without tooling`}
    >
      <Waterfall label="From what the run brings to what remains of it" lines={linesOf(rung)} />
      <table
        className="mt-4 w-full text-sm sm:text-base"
        aria-label="Costs, each with its workings"
      >
        <thead>
          <tr className="text-sm text-ink-soft">
            <th scope="col" className="text-left font-normal">
              cost
            </th>
            <th scope="col" className={`${right} font-normal`}>
              each
            </th>
            <th scope="col" className={`${right} font-normal`}>
              the run
            </th>
          </tr>
        </thead>
        <tbody>
          {rung.costLines.map((line, at) => (
            <tr key={`${at} ${line.name}`} className="stitched bg-[length:100%_2px] bg-top">
              <th scope="row" className="py-1.5 text-left font-semibold">
                {line.name}
                <span className="block text-sm font-normal text-ink-soft">{line.workings}</span>
              </th>
              <td className={right}>{moneyText(line.each, 4)}</td>
              <td className={`${right} font-semibold`}>{moneyText(line.amount)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </Card>
  );
}

function linesOf(rung: BreakNumbers): WaterfallLine[] {
  const costs = rung.costLines
    .filter(({ amount }) => Number(amount) !== 0)
    .map(({ kind, name, amount }): WaterfallLine => ({
      label: name,
      amount,
      kind: hourlyKinds.includes(kind) ? 'work' : 'bought',
    }));
  return [
    { label: 'brings in all', amount: rung.total, kind: 'price' },
    ...costs,
    { label: 'remains', amount: profitOf(rung), kind: 'left' },
  ];
}
