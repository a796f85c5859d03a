import type { ReactNode } from 'react';
import { classNames } from '../lib/class-names.ts';

export interface Bar {
  label: ReactNode;
  /** How long the bar is, on the scale of the others. */
  value: number;
  /** What is said at the right. */
  shown: ReactNode;
  tone?: 'info' | 'attention' | 'danger' | 'act' | undefined;
}

const tones = {
  info: 'bg-slate',
  attention: 'bg-brass',
  danger: 'bg-oxblood',
  act: 'bg-verdigris',
};

/** A few values beside each other, as bars with their figures. */
export function BarList({ label, bars }: { label: string; bars: readonly Bar[] }) {
  const longest = Math.max(...bars.map((bar) => bar.value), Number.MIN_VALUE);
  return (
    <table className="w-full" aria-label={label}>
      <tbody>
        {bars.map((bar, index) => (
          <tr key={index} className="h-9">
            <th scope="row" className="pr-3 text-left font-normal">
              {bar.label}
            </th>
            <td className="w-2/5" aria-hidden="true">
              <span
                className={classNames('block h-3.5 rounded-[2px]', tones[bar.tone ?? 'info'])}
                style={{ width: `${Math.max((bar.value / longest) * 100, 0)}%` }}
              />
            </td>
            <td className="pl-3 text-right font-semibold whitespace-nowrap">{bar.shown}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
