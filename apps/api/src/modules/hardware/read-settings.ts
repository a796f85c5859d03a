import type { Setting } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaledText } from '../../db/columns/scaled-decimal.ts';
import type { Hardware } from './hardware.entity.ts';
import { kindsWithParts, partsAmong, type WithParts } from './kits.ts';

/** Which kind it is, and how it is set. */
type NamedSetting = Setting & Pick<Hardware, 'id' | 'name' | 'unit'>;

/** With the parts of a kit. */
export interface KitSetting extends NamedSetting {
  parts: NamedSetting[];
}

interface SettingRow extends WithParts {
  name: string;
  unit: Hardware['unit'];
  post_length_mm: number | null;
  stack_min_mm: number | null;
  stack_max_mm: number | null;
  setting_die: string;
  setting_die_here: number;
}

const columns = [
  ...['name', 'unit', 'post_length_mm', 'stack_min_mm', 'stack_max_mm'],
  ...['setting_die', 'setting_die_here'],
];

/** What is known of setting these kinds of hardware, by their number. */
export async function readSettings(
  em: EntityManager,
  ids: readonly number[],
): Promise<Map<number, KitSetting>> {
  const rows = await kindsWithParts<SettingRow>(em, ids, columns);
  const byId = new Map(rows.map((row) => [row.id, row]));
  return new Map(
    rows.map((row) => {
      const parts = partsAmong(row, byId).map(({ part }) => settingOf(part));
      return [row.id, { ...settingOf(row), parts }];
    }),
  );
}

const settingOf = (row: SettingRow): NamedSetting => ({
  id: row.id,
  name: row.name,
  unit: row.unit,
  postLengthMm: lengthText(row.post_length_mm),
  stackMinMm: lengthText(row.stack_min_mm),
  stackMaxMm: lengthText(row.stack_max_mm),
  settingDie: row.setting_die,
  settingDieHere: row.setting_die_here === 1,
});

const lengthText = (nanometres: number | null): string | null => unscaledText(nanometres, 6);
