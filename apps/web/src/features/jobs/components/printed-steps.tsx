import type { Job } from '@hidewright/contract';
import { minutesText } from '../../../lib/formatting.ts';

/** The steps on paper: what is planned, and room to write what was. */
export function PrintedSteps({ job }: { job: Job }) {
  return (
    <table
      className="mt-4 hidden w-full border-collapse print:table"
      aria-label="Steps, to write on"
    >
      <thead>
        <tr className="border-b-2 border-edge text-left">
          {['Step', 'About', 'Of', 'Good', 'Rejects', 'Seconds', 'Minutes'].map((word) => (
            <th key={word} scope="col" className="px-2 py-1">
              {word}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {job.steps.map((step) => (
          <tr key={step.id} className="border-b border-edge align-top">
            <th scope="row" className="px-2 py-3 text-left">
              {step.name}
              {step.caution && (
                <span className="block max-w-72 text-sm font-normal">
                  <strong>{step.caution.level}</strong> {step.caution.text}
                </span>
              )}
            </th>
            <td className="px-2 py-3 whitespace-nowrap">{minutesText(step.plannedMinutes)}</td>
            <td className="px-2 py-3">{step.limit}</td>
            {['good', 'rejects', 'seconds', 'minutes'].map((room) => (
              <td key={room} className="w-20 border-l border-edge" />
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
