import type { Today } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { dayText } from '../../../lib/formatting.ts';

type Earned = NonNullable<Today['earned']>;

const width = 360;
const height = 130;

/** What an hour left on the latest runs: a bar per bench hour, a mark all in, the target across. */
export function EarnedHours({ earned, today }: { earned: Earned; today: string }) {
  const { currency } = useWorkshop();
  return (
    <Card title="An hour earned" subtitle={`latest finished runs, ${currency}`}>
      {earned.jobs.length === 0 ? (
        <p className="text-ink-soft">Shown once a run with logged minutes is finished.</p>
      ) : (
        <>
          <Picture earned={earned} />
          <p className="mt-2 text-sm text-ink-soft">
            bar: per bench hour, before wages · line: per hour all in, after wages and desk time
          </p>
          <details className="mt-2 text-sm">
            <summary className="cursor-pointer text-verdigris">The figures</summary>
            <Figures earned={earned} today={today} />
          </details>
        </>
      )}
    </Card>
  );
}

function Picture({ earned }: { earned: Earned }) {
  const target = Number(earned.target);
  const top = Math.max(target, ...earned.jobs.map((job) => Number(job.perBenchHour))) * 1.15;
  const y = (value: number) => height - (Math.max(0, value) / top) * height;
  const step = width / Math.max(earned.jobs.length, 6);
  return (
    <svg
      viewBox={`0 0 ${width} ${height + 4}`}
      className="w-full"
      role="img"
      aria-label={describe(earned)}
    >
      {earned.jobs.map((job, index) => {
        const x = index * step + step * 0.2;
        const bench = Number(job.perBenchHour);
        return (
          <g key={job.number}>
            <rect
              x={x}
              y={y(bench)}
              width={step * 0.55}
              height={height - y(bench)}
              rx={2}
              className="fill-verdigris"
            />
            <rect
              x={x - 2}
              y={y(Number(job.perHourAllIn)) - 1.5}
              width={step * 0.55 + 4}
              height={3}
              className="fill-ink"
            />
          </g>
        );
      })}
      <line
        x1={0}
        x2={width}
        y1={y(target)}
        y2={y(target)}
        strokeDasharray="6 4"
        strokeWidth={1.5}
        className="stroke-brass"
      />
      <text x={2} y={y(target) - 5} className="fill-brass text-[12px]">
        target {Number(earned.target)}
      </text>
      <line x1={0} x2={width} y1={height} y2={height} className="stroke-edge" />
    </svg>
  );
}

function Figures({ earned, today }: { earned: Earned; today: string }) {
  return (
    <table className="mt-2 w-full">
      <thead className="text-left text-ink-soft">
        <tr>
          <th scope="col" className="font-normal">
            run
          </th>
          <th scope="col" className="text-right font-normal">
            bench
          </th>
          <th scope="col" className="text-right font-normal">
            all in
          </th>
        </tr>
      </thead>
      <tbody>
        {earned.jobs.map((job) => (
          <tr key={job.number}>
            <th scope="row" className="text-left font-normal">
              {job.number} {job.title}, {dayText(job.finishedOn, today)}
            </th>
            <td className="text-right">{job.perBenchHour}</td>
            <td className="text-right">{job.perHourAllIn}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function describe(earned: Earned): string {
  const best = Math.max(...earned.jobs.map((job) => Number(job.perBenchHour)));
  const least = Math.min(...earned.jobs.map((job) => Number(job.perBenchHour)));
  return `Per bench hour, the latest ${earned.jobs.length} runs left ${least.toFixed(2)} to ${best.toFixed(2)}; the target is ${earned.target}.`;
}
