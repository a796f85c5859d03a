import type { ToolReply } from '@hidewright/contract';
import { countText } from '../../lib/formatting.ts';

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
