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
  const toolingShort = answers.some(({ about, enough }) => about === 'tooling' && !enough);
  if (earliestDay === null) return 'Nobody can tell yet by when it could be packed.';
  if (earliestDay <= by)
    return toolingShort ? 'With the tooling here, it can be packed in time.' : '';
  const proviso = toolingShort ? ' and the tooling is here' : '';
  return `It can be packed by ${dayText(earliestDay, today)}, if what is short is ordered today${proviso}.`;
}
