import type { CheckAnswer, RunCheck } from '@hidewright/contract';
import { dayText } from '../../lib/formatting.ts';

const words: Record<CheckAnswer['about'], string> = {
  leather: 'leather',
  hardware: 'hardware',
  supplies: 'supplies',
  tooling: 'tooling',
  press: 'the press',
  hours: 'bench hours',
};

/** "Leather and bench hours are short." */
export function shortWords(answers: readonly CheckAnswer[]): string {
  const short = [
    ...new Set(answers.filter(({ enough }) => !enough).map(({ about }) => words[about])),
  ];
  const [only] = short;
  const one = short.length === 1 && only !== words.hours && only !== words.supplies;
  return `${listed(short)} ${one ? 'is' : 'are'} short.`;
}

function listed(all: readonly string[]): string {
  return all.length < 2 ? all.join('') : `${all.slice(0, -1).join(', ')} and ${all.at(-1) ?? ''}`;
}

/** By when it can be packed after all, if what is short is bought today. */
export function mendedWords(
  { answers, earliestDay, by }: Pick<RunCheck, 'answers' | 'earliestDay' | 'by'>,
  today: string,
): string {
  if (earliestDay === null) return 'Nobody can tell yet by when it could be packed.';
  if (earliestDay <= by) {
    return `It can still be packed in time, if ${conditions(answers)}.`;
  }
  return `It can be packed by ${dayText(earliestDay, today)}, if ${conditions(answers)}.`;
}

/** What has to happen for the day to hold. */
function conditions(answers: readonly CheckAnswer[]): string {
  const short = (...kinds: CheckAnswer['about'][]) =>
    answers.some(({ about, enough }) => !enough && kinds.includes(about));
  const all = [
    ...(short('leather', 'hardware', 'supplies') ? ['what is short is ordered today'] : []),
    ...(short('tooling') ? ['the tooling is here'] : []),
    ...(short('press') ? ['a press is found for it'] : []),
  ];
  return all.length === 0 ? 'nothing else comes first' : listed(all);
}

/** When what is on hand and what comes must be there. */
export function inTimeWords({ answers, startBy }: RunCheck, today: string): string {
  const stock = answers.filter(({ unit }) => unit === 'mm2' || unit === 'piece');
  const waits = stock.some(({ needed, freeNow }) => needed !== freeNow);
  return waits
    ? `In time, if what is on order is here by ${dayText(startBy, today)}.`
    : 'In time: everything is there.';
}
