import { hourlyKinds, type BreakNumbers, type RunInput } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { Card } from '../../../../components/card.tsx';
import { KeyFigures } from '../../../../components/key-figures.tsx';
import {
  hoursText,
  minutesText,
  moneyText,
  numberText,
  percentText,
} from '../../../../lib/formatting.ts';
import { profitOf } from './profit.ts';

interface HoursCardProps {
  input: RunInput;
  rung: BreakNumbers;
}

/** The two hourly figures, always together, each with its formula; and where the hours go. */
export function HoursCard({ input, rung }: HoursCardProps) {
  const bought = rung.costLines
    .filter(({ kind }) => !hourlyKinds.includes(kind))
    .reduce((sum, { amount }) => sum.plus(amount), new Decimal(0));
  const { restPercent = '0' } = input;
  return (
    <Card title="What an hour earns">
      <KeyFigures
        large
        figures={[
          {
            word: 'per bench hour',
            figure: moneyText(rung.perBenchHour),
            note: `(${moneyText(rung.total)} − ${moneyText(bought.toFixed(2))} bought) ÷ ${hoursText(rung.benchMinutes)} at the bench, before wages`,
          },
          {
            word: 'per hour all in',
            figure: moneyText(rung.perHourAllIn),
            note: `${moneyText(profitOf(rung))} after wages and overhead ÷ ${hoursText(rung.allMinutes)}, desk time and packing included`,
          },
        ]}
      />
      <table className="mt-5 w-full text-sm sm:text-base" aria-label="Where the hours go">
        <tbody>
          {rung.minutesByStep.map((step, at) => (
            <tr key={`${at} ${step.name}`} className="stitched bg-[length:100%_2px] bg-top">
              <th scope="row" className="py-1.5 text-left font-semibold">
                {step.name}
              </th>
              <td className="py-1.5 pl-3 text-right text-ink-soft">{numberText(step.units, 0)}×</td>
              <td className="py-1.5 pl-3 text-right font-semibold whitespace-nowrap">
                {minutesText(step.minutes)}
              </td>
            </tr>
          ))}
          <tr className="stitched bg-[length:100%_2px] bg-top">
            <th scope="row" className="py-1.5 text-left font-semibold">
              Desk time
            </th>
            <td />
            <td className="py-1.5 pl-3 text-right font-semibold whitespace-nowrap">
              {minutesText(input.deskMinutesPerOrder)}
            </td>
          </tr>
        </tbody>
      </table>
      {Number(restPercent) > 0 && (
        <p className="mt-2 text-sm text-ink-soft">
          {`${percentText(restPercent)} for rest is in the minutes of each step.`}
        </p>
      )}
    </Card>
  );
}
