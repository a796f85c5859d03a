import type { ToolReply } from '@hidewright/contract';
import { countText, dayText } from '../../lib/formatting.ts';

/** "Cutting die 7" */
export function toolTitle({ kind, number }: Pick<ToolReply, 'kind' | 'number'>): string {
  return `${kind === 'cutting die' ? 'Cutting die' : 'Stamp plate'} ${number}`;
}

/** What a tool's life is counted in. */
export function usesWord(kind: ToolReply['kind']): string {
  return kind === 'cutting die' ? 'cuts' : 'impressions';
}

/** "2,310 of 10,000" */
export function wearText({ used, lifeUses }: Pick<ToolReply, 'used' | 'lifeUses'>): string {
  return `${countText(used)} of ${countText(lifeUses)}`;
}

/** What the form offers: where it is, and where it may go from there. Giving back and scrapping are acts of their own. */
export function statesFor(state: ToolReply['state'] | undefined): readonly ToolReply['state'][] {
  switch (state) {
    case undefined:
      return ['on the rack', 'on order'];
    case 'on order':
    case 'returned':
      return [state, 'on the rack'];
    default:
      return [state];
  }
}

/** "the shop’s", or "their own, kept until Mon 14 Dec" */
export function ownerText(
  { ownedBy, keptUntil }: Pick<ToolReply, 'ownedBy' | 'keptUntil'>,
  today: string,
): string {
  if (ownedBy === 'shop') return 'the shop’s';
  return keptUntil === null
    ? 'the customer’s own'
    : `the customer’s own, kept until ${dayText(keptUntil, today)}`;
}
