import { shakeRun, type BreakNumbers, type RunInput, type Shake } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { useMemo } from 'react';
import { Card } from '../../../../components/card.tsx';
import { countText, moneyText } from '../../../../lib/formatting.ts';

interface ShakeCardProps {
  input: RunInput;
  rung: BreakNumbers;
}

const byPercent = 20;

/** What an hour earns where one thing turns out better or worse, the price held: the longest strip matters most. */
export function ShakeCard({ input, rung }: ShakeCardProps) {
  const shakes = useMemo(() => shakeRun(input, rung, byPercent), [input, rung]);
  const all = shakes.flatMap(({ less, more }) => [less.perBenchHour, more.perBenchHour]);
  const low = Decimal.min(rung.perBenchHour, ...all);
  const high = Decimal.max(rung.perBenchHour, ...all);
  const span = Decimal.max(high.minus(low), '0.01');
  const share = (value: string) => new Decimal(value).minus(low).div(span).times(100).toNumber();
  return (
    <Card
      title="If it turns out otherwise"
      subtitle={`per bench hour at ${countText(rung.quantity)}, ${byPercent} % less and more of each; ${moneyText(rung.perBenchHour)} as it stands`}
    >
      <table className="w-full" aria-label="What happens per hour, each thing 20 % less and more">
        <thead className="text-sm text-ink-soft">
          <tr>
            <th scope="col" className="text-left font-normal">
              what
            </th>
            <th scope="col" className="text-right font-normal">
              {byPercent} % less
            </th>
            <th scope="col" className="w-2/5 px-3 font-normal">
              <span className="sr-only">between</span>
            </th>
            <th scope="col" className="text-right font-normal">
              {byPercent} % more
            </th>
          </tr>
        </thead>
        <tbody>
          {shakes.map((shake) => (
            <tr key={shake.what} className="h-11">
              <th scope="row" className="text-left font-normal">
                {shake.what}
              </th>
              <Hourly figures={shake.less} />
              <td className="px-3" aria-hidden="true">
                <Strip shake={shake} share={share} now={share(rung.perBenchHour)} />
              </td>
              <Hourly figures={shake.more} />
            </tr>
          ))}
        </tbody>
      </table>
    </Card>
  );
}

function Hourly({ figures }: { figures: Shake['less'] }) {
  return (
    <td className="text-right leading-tight">
      <span className="font-semibold">{moneyText(figures.perBenchHour)}</span>
      <span className="block text-sm whitespace-nowrap text-ink-soft">
        {`all in ${moneyText(figures.perHourAllIn)}`}
      </span>
    </td>
  );
}

interface StripProps {
  shake: Shake;
  share: (value: string) => number;
  now: number;
}

function Strip({ shake, share, now }: StripProps) {
  const ends = [share(shake.less.perBenchHour), share(shake.more.perBenchHour)];
  const [from, to] = [Math.min(...ends), Math.max(...ends)];
  return (
    <span className="relative block h-5">
      <span
        className="absolute top-1/2 h-3 -translate-y-1/2 rounded-[2px] bg-slate"
        style={{ left: `${from}%`, width: `${Math.max(to - from, 0.8)}%` }}
      />
      <span
        className="absolute inset-y-0 border-l-2 border-ink"
        style={{ left: `${Math.min(now, 99.5)}%` }}
      />
    </span>
  );
}
