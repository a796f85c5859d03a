import type { EntityManager } from '@mikro-orm/sqlite';
import { binTag, tagAddress } from '@hidewright/domain';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import type { Label } from '../../papers/label-sheet-pdf.ts';
import { sayDay } from '../../say-day.ts';
import { sayArea } from '../stock/say-area.ts';
import { Workshop } from '../workshop/workshop.entity.ts';

interface Asked {
  lots: readonly number[];
  hardware: readonly number[];
  /** Where the workshop is reached; without it the code is the bare tag. */
  publicUrl: string | undefined;
}

interface LotRow {
  tag: string;
  name: string;
  form: string;
  pieces: number;
  area: number;
  place: string;
  received_on: string;
}

interface BinRow {
  id: number;
  name: string;
  kind: string;
  pack_size: number;
}

/** What stands on the tags of lots and bins, in the order of their tags. */
export async function readLabels(em: EntityManager, asked: Asked): Promise<Label[]> {
  const codeOf = (tag: string) =>
    asked.publicUrl === undefined ? tag : tagAddress(asked.publicUrl, tag);
  const { areaUnit } = await em.findOneOrFail(Workshop, 1);
  const lots = await em.execute<LotRow[]>(
    `SELECT lot.tag, leather.name, lot.form, lot.pieces, lot.measured_area_mm2 AS area, lot.place, lot.received_on
     FROM lot JOIN leather ON leather.id = lot.leather_id
     WHERE lot.id IN (SELECT value FROM json_each(?)) ORDER BY lot.tag`,
    [JSON.stringify(asked.lots)],
  );
  const bins = await em.execute<BinRow[]>(
    `SELECT id, name, kind, pack_size FROM hardware
     WHERE id IN (SELECT value FROM json_each(?)) ORDER BY name`,
    [JSON.stringify(asked.hardware)],
  );
  return [
    ...lots.map((row) => ({
      tag: row.tag,
      code: codeOf(row.tag),
      name: row.name,
      lines: [
        `${row.pieces > 1 ? `${row.pieces} × ` : ''}${row.form}, ${sayArea(unscaled(row.area, 3), areaUnit)}`,
        ...(row.place === '' ? [] : [row.place]),
        `received ${sayDay(row.received_on)}`,
      ],
    })),
    ...bins.map(({ id, name, kind, pack_size }) => ({
      tag: binTag(id),
      code: codeOf(binTag(id)),
      name,
      lines: [kind, ...(pack_size > 1 ? [`in packs of ${pack_size}`] : [])],
    })),
  ];
}
