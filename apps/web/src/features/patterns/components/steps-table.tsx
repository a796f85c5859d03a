import type { PatternDefinition } from '@hidewright/contract';
import { minutesText, numberText, percentText } from '../../../lib/formatting.ts';
import { stepNotes } from '../step-notes.ts';

type Steps = Extract<PatternDefinition['work'], { kind: 'steps' }>['steps'];

const right = 'py-1.5 pl-3 text-right';

/** The operations of the work with their times and rejects. */
export function StepsTable({ steps }: { steps: Steps }) {
  return (
    <table aria-label="Steps" className="w-full text-sm sm:text-base">
      <thead>
        <tr className="text-sm text-ink-soft">
          <th scope="col" className="text-left font-normal">
            step
          </th>
          <th scope="col" className={`${right} font-normal`}>
            setup
          </th>
          <th scope="col" className={`${right} font-normal`}>
            each
          </th>
          <th scope="col" className={`${right} font-normal`}>
            rejects
          </th>
        </tr>
      </thead>
      <tbody>
        {steps.map((step, at) => (
          <tr key={at} className="stitched bg-[length:100%_2px] bg-top">
            <th scope="row" className="py-1.5 text-left font-semibold">
              {`${at + 1} ${step.name}`}
              <StepNote>{stepNotes(step)}</StepNote>
            </th>
            <td className={`${right} whitespace-nowrap`}>{minutesText(step.setupMinutes)}</td>
            <td className={right}>{`${numberText(step.secondsPerUnit, 2)} s per ${step.per}`}</td>
            <td className={`${right} whitespace-nowrap`}>{percentText(step.rejectPercent)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function StepNote({ children }: { children: string }) {
  return children !== '' && <span className="block text-sm font-normal">{children}</span>;
}
