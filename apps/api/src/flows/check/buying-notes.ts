import { countWords, Exact, type Say } from '@hidewright/domain';
import type { CheckedRun } from './checked-runs.ts';
import type { Lacking } from './lacking.ts';

/** What was not drafted and why, and where a price break made it more. */
export function buyingNotes(lacking: Lacking, say: Say): string[] {
  const { name, buying, missing, drafted } = lacking;
  return [
    ...(drafted > 0 ? [draftedNote(lacking)] : []),
    ...(missing > 0 && buying.supplierId === null
      ? [`${name} has no supplier. Say who sells it, then draft again.`]
      : breakNotes(lacking, say)),
  ];
}

/** Rivet 9 mm is on draft P-0012, which you still have to send. */
function draftedNote({ name, buying: { drafts }, missing }: Lacking): string {
  const what = missing > 0 ? `A part of the ${name}` : name;
  const where = drafts.length > 1 ? 'drafts' : 'draft';
  return `${what} is on ${where} ${drafts.join(' and ')}, which you still have to send.`;
}

function breakNotes({ of, name, toBuy }: Lacking, say: Say): string[] {
  if (toBuy === null) return [];
  const { quantity, plain, sameCost } = toBuy;
  const amount = (text: string) =>
    of === 'leather' ? say.area(new Exact(text)) : countWords(text);
  if (quantity !== plain) {
    return [
      `${name}: ${amount(quantity)} cost less than ${amount(plain)}, so ${amount(quantity)} are drafted.`,
    ];
  }
  return sameCost === null
    ? []
    : [`${name}: ${amount(sameCost)} cost no more than the ${amount(quantity)} that are drafted.`];
}

/** What is the customer's is on no draft: they are asked for it. */
export function customersBring(runs: readonly CheckedRun[]): string[] {
  const theirs = runs.flatMap(({ facts }) =>
    facts.items.flatMap(({ item, short }) => (item.fromCustomer && short > 0 ? [item.name] : [])),
  );
  return [...new Set(theirs)].map((name) => `${name} comes from the customer: ask for it.`);
}
