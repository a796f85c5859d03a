import { countWords, lossesUnsaid } from '@hidewright/domain';
import type { CheckedRun } from './checked-runs.ts';
import type { PlannedRun } from './runs-asked.ts';

type Checked = Pick<CheckedRun, 'planned' | 'facts'>;

/** What a run's pattern should be looked at for, in sentences that say what to do; it stops nothing. */
export function patternRemarks(checked: Checked & Pick<CheckedRun, 'misfits'>): string[] {
  const names = withoutSpares(checked);
  const spares = names.length === 0 ? [] : [noSparesWords(checked.planned, names)];
  return [...checked.misfits, ...spares];
}

/** Hardware that is counted to the piece although pieces will fail: nobody said which of them need it. */
function withoutSpares({ planned: { plan }, facts }: Checked): string[] {
  if (plan.cutCount <= plan.quantity) return [];
  const unsaid = new Set(plan.input.hardware.filter(lossesUnsaid).map((line) => line.hardwareId));
  return facts.items
    .filter(({ item }) => item.kind === 'hardware' && unsaid.has(item.hardwareId))
    .map(({ item }) => item.name);
}

function noSparesWords({ plan, quoteId }: PlannedRun, names: readonly string[]): string {
  const more = plan.cutCount - plan.quantity;
  const cut = more === 1 ? '1 more piece is cut' : `${countWords(more)} more pieces are cut`;
  const needed = names.length === 1 ? 'it is needed' : 'they are needed';
  const [pattern, mend] =
    quoteId === null
      ? ['the pattern', 'Lay some by, or say it on the pattern.']
      : [
          'the pattern as quoted',
          'Lay some by. Say it on the pattern, and the next quote counts them.',
        ];
  return `${cut} than ordered, and no spares of ${names.join(' and ')} are counted for them: ${pattern} does not say from when on ${needed}. ${mend}`;
}
