import {
  workOutWeekMix,
  type KindOfWorkTyped,
  type WeekStart,
  type WeekTyped,
} from '@hidewright/contract';
import { dropDraft } from '../../lib/draft.ts';
import { dropKept, readKept, writeKept } from '../../lib/kept.ts';

export const draftKey = 'week-mix';

export const blankKind = (kind: KindOfWorkTyped['kind'], deskMinutes = ''): KindOfWorkTyped => ({
  name: '',
  kind,
  benchMinutes: '',
  deskMinutes,
  left: '',
  mostPerWeek: null,
  leastPerWeek: '0',
});

/** The week that a person worked out last on this device; what an earlier release kept may be of no use any more. */
export function keptWeek(person: string): WeekTyped | undefined {
  return workOutWeekMix.body?.safeParse(readKept(person, draftKey)).data;
}

/** The week as it was last worked out, or else what the shop's own runs say. */
export function weekToType({ week }: WeekStart, person: string): WeekTyped {
  const kept = keptWeek(person);
  if (kept !== undefined) return kept;
  return week.kinds.length > 0 ? week : { ...week, kinds: [blankKind('run')] };
}

export const keepWeek = (person: string, week: WeekTyped): void =>
  writeKept(person, draftKey, week);

export function forgetWeek(person: string): void {
  dropDraft(draftKey);
  dropKept(person, draftKey);
}
