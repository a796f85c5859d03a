import { countWords } from '@hidewright/domain';
import type { ToolForRun, ToolReply } from '@hidewright/contract';
import type { Run } from './tool-for-run.ts';

type Found = Omit<ToolForRun, 'newCost' | 'sentence'>;

/** What is there for the run, whether it lasts, and what to do: one or two sentences. */
export function toolSentence(found: Found, run: Run): string {
  const { tool } = found;
  if (tool === null) return sentenceWithout(found, run);
  return [lifeSentence(found, tool, run), termSentence(tool)].filter(Boolean).join(' ');
}

function sentenceWithout({ kind, onOrder }: Found, { customerId }: Run): string {
  if (onOrder !== null)
    return `Number ${onOrder} is on order for it already, so no new ${kind} need be charged.`;
  if (kind === 'stamp plate' && customerId === null)
    return 'No stamp plate is kept for this pattern alone. Name the customer to look for theirs.';
  return `No ${kind} is on the rack for it. A new one is a line of its own, charged once.`;
}

function lifeSentence(found: Found, tool: ToolReply, { runs }: Run): string {
  const { strikes, strikesInAll, enough, enoughInAll, replacedAfter } = found;
  const word = tool.kind === 'cutting die' ? 'cuts' : 'impressions';
  const name = nameOf(tool);
  if (tool.usesLeft === 0)
    return `${name} has no life left. Look at it before the run: correct its count, or order a new one.`;
  const has = `${name} has ${countWords(tool.usesLeft)} ${word} left`;
  if (!enough)
    return `${has}: it will be replaced after ${countWords(replacedAfter ?? 0)} of the ${countWords(strikes)}. Order a new one before the run begins.`;
  if (enoughInAll) {
    const whole =
      runs === 0 ? `the ${countWords(strikes)} of this run` : 'this run and its repeats';
    return `${has}: enough for ${whole}, so it need not be charged again.`;
  }
  return `${has}: enough for this run, so it need not be charged again, but not for the ${countWords(strikesInAll)} with the repeats.`;
}

function nameOf({ kind, number, slot }: ToolReply): string {
  const name = `${kind === 'cutting die' ? 'Cutting die' : 'Stamp plate'} ${number}`;
  return slot === '' ? name : `${name} in slot ${slot}`;
}

function termSentence({ ownedBy, customerName, termOver }: ToolReply): string {
  if (ownedBy === 'shop') return '';
  const own = `It is ${customerName ?? 'the customer'}’s own`;
  return termOver
    ? `${own}, and the day until which it is kept has come: ask before you use it.`
    : `${own}.`;
}
