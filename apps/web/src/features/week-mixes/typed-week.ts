import type { KindOfWorkTyped, WeekStart, WeekTyped } from '@hidewright/contract';
import { dropDraft, readDraft, writeDraft } from '../../lib/draft.ts';

export const draftKey = 'week-mix';
const sentKey = 'week-mix-sent';

export const blankKind = (kind: KindOfWorkTyped['kind'], deskMinutes = ''): KindOfWorkTyped => ({
  name: '',
  kind,
  benchMinutes: '',
  deskMinutes,
  left: '',
  mostPerWeek: null,
  leastPerWeek: '0',
});

/** The week as it was last worked out in this tab, or else what the shop's own runs say. */
export function weekToType({ week }: WeekStart): WeekTyped {
  const sent = readDraft(sentKey) as WeekTyped | undefined;
  if (sent !== undefined) return sent;
  return week.kinds.length > 0 ? week : { ...week, kinds: [blankKind('run')] };
}

export const keepWeek = (week: WeekTyped): void => writeDraft(sentKey, week);

export function forgetWeek(): void {
  dropDraft(draftKey);
  dropDraft(sentKey);
}
