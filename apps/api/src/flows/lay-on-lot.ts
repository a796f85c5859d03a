import { outlinePath, type SideInput, type SideLayout } from '@hidewright/domain';
import {
  type BodyOf,
  layRulesOf,
  type layOnLot as layOnLotEndpoint,
  type LotDrawing,
  type LotLayout,
  type PatternDefinition,
} from '@hidewright/contract';
import type { Context } from '../context.ts';
import { invalid, notFound } from '../http/problem.ts';
import { sideLayoutFor, type Worked } from '../modules/layouts/stored-layouts.ts';
import { Lot } from '../modules/lots/lot.entity.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import { definitionOf, latestVersion } from '../modules/patterns/pattern-versions.ts';
import { pressReach } from './press-reach.ts';

/** A pattern and a lot as they are drawn, with the names that go with them. */
export interface AskedOfLot {
  names: Pick<LotLayout, 'lotId' | 'tag' | 'patternId' | 'patternName' | 'outlinePath'>;
  input: SideInput;
}

/** A pattern laid on a lot. */
export interface LaidOnLot {
  names: AskedOfLot['names'];
  worked: Worked<SideInput, SideLayout>;
}

/**
 * How a pattern's pieces lie on a lot as it is drawn; a worker may have to work it out, so this comes before the
 * transaction that keeps it.
 * @throws {Problem} 404, 422 where the lot or the pattern is not drawn
 */
export async function layOnLot(
  context: Pick<Context, 'orm' | 'workers'>,
  lotId: number,
  { patternId, search, widestMm }: BodyOf<typeof layOnLotEndpoint>,
): Promise<LaidOnLot> {
  const { names, input } = await askOfLot(context, lotId, patternId);
  const asked: SideInput =
    search === 'strips'
      ? {
          ...input,
          widestMm: Number(widestMm ?? (await pressReach(context.orm.em.fork())).widestStripMm),
        }
      : { ...input, search };
  return { names, worked: await sideLayoutFor(context, asked) };
}

/** @throws {Problem} 404, 422 where the lot or the pattern is not drawn */
export async function askOfLot(
  { orm }: Pick<Context, 'orm'>,
  lotId: number,
  patternId: number,
): Promise<AskedOfLot> {
  const em = orm.em.fork();
  const lot = await em.findOne(Lot, lotId);
  if (lot === null) throw notFound('lot');
  const pattern = await em.findOne(Pattern, patternId);
  if (pattern === null) throw fault('This pattern is not there. Choose one from the list.');
  const definition = definitionOf(await latestVersion({ em }, pattern));
  const input = sideInputOf(lot, definition);
  if (typeof input === 'string') throw fault(input);
  return {
    names: {
      lotId,
      tag: lot.tag,
      patternId,
      patternName: pattern.name,
      outlinePath: outlinePath(input.outline),
    },
    input,
  };
}

/** What the domain is asked, or what is missing for it. */
export function sideInputOf(lot: Lot, definition: PatternDefinition): SideInput | string {
  const edge = lot.outline as LotDrawing['outline'];
  if (edge === null) return `Draw the edge of ${lot.tag} first.`;
  if (definition.outline === null) return 'This pattern has no outline to lay. Draw one first.';
  return {
    ...layRulesOf(definition, definition.outline),
    side: { outline: edge, flaws: lot.flaws as LotDrawing['flaws'] },
  };
}

export function laidOnLotReply({ worked, names }: LaidOnLot): LotLayout {
  return { ...names, ...worked.layout };
}

const fault = (message: string) => invalid([{ field: 'patternId', message }]);
