import {
  adviseCut as compare,
  adviseLots,
  cutCount,
  goodShare,
  minorDigits,
  type CutAdvice,
  type RackLot,
} from '@hidewright/domain';
import {
  layRulesOf,
  type adviseCut as adviseCutEndpoint,
  type BodyOf,
  type CutAdviceReply,
  type PatternDefinition,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { priceText } from '../../http/decimal-text.ts';
import { invalid } from '../../http/problem.ts';
import type { LayoutToKeep } from '../../modules/layouts/stored-layouts.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import {
  definitionOf,
  findPattern,
  latestVersion,
} from '../../modules/patterns/pattern-versions.ts';
import { Workshop } from '../../modules/workshop/workshop.entity.ts';
import { pressReach } from '../press-reach.ts';
import type { AdvisedSource, Note } from './advised-source.ts';
import { lotSources } from './lot-sources.ts';
import { panelSources } from './panel-sources.ts';
import { priceOfArea } from './price-of-area.ts';
import { areaPerPiece, stripSources } from './strip-sources.ts';
import { stripWidths } from './strip-widths.ts';

/** An answer, and the layouts behind it: the transaction that gives it keeps them for the next time. */
export interface WorkedAdvice {
  reply: CutAdviceReply;
  compared: readonly LayoutToKeep[];
}

/**
 * What a run of a pattern is best cut from: the panels on offer, strips of the widths that a press takes, and the
 * lots on the rack, each with the whole price beside the share that the run uses.
 * @throws {Problem} 404, 422 for a pattern without an outline
 */
export async function adviseCut(
  context: Context,
  patternId: number,
  { good, panels }: BodyOf<typeof adviseCutEndpoint>,
): Promise<WorkedAdvice> {
  const em = context.orm.em.fork();
  const pattern = await findPattern({ em }, patternId);
  const definition = definitionOf(await latestVersion({ em }, pattern));
  const rules = rulesOf(definition);
  const workshop = await em.findOneOrFail(Workshop, 1);
  const leather = await em.findOneOrFail(Leather, definition.leatherId);
  const priceOf = priceOfArea(priceText(leather.pricePerFt2));
  const reach = await pressReach(em);
  const widths = stripWidths(rules.outline, rules.trimMm, reach.widestStripMm);
  const compared: LayoutToKeep[] = [];
  const note: Note = (worked) => {
    compared.push(worked);
    return worked;
  };
  const strips = await stripSources(context, rules, widths, priceOf, note);
  const asked = { ...definition, layoutBy: 'outline' as const, handCount: null };
  const sources = [
    ...(await panelSources(context, asked, rules.outline, panels, priceOf, note)),
    ...strips,
    ...(await lotSources(
      context,
      definition,
      reach,
      strips[0] ? areaPerPiece(strips[0]) : null,
      note,
    )),
  ];
  const { pieces: cut } = cutCount({
    good,
    rate: goodShare(definition.work),
    confidence: workshop.confidencePercent.div(100).toNumber(),
  });
  const run = { cut, good, minorDigits: minorDigits(workshop.currency) };
  const advice = compare(
    run,
    sources.map(({ source }) => source),
  );
  const reply = {
    good,
    cut,
    rows: sources.map((source, at) => rowOf(source, advice[at] as CutAdvice, cut)),
    rack: adviseLots(rackLots(sources), cut),
  };
  return { reply, compared };
}

function rulesOf(definition: PatternDefinition) {
  if (definition.outline !== null) return layRulesOf(definition, definition.outline);
  const message = 'This pattern is counted by hand. Draw its outline to compare what to cut from.';
  throw invalid([{ field: 'outline', message }]);
}

function rowOf(
  { source, shown, periodMm, offcutAfter }: AdvisedSource,
  { key: _key, ...advice }: CutAdvice,
  cut: number,
): CutAdviceReply['rows'][number] {
  const { needed } = advice;
  const last = needed === null ? 0 : cut - (needed - 1) * source.pieces;
  return {
    ...shown,
    ...advice,
    pieces: source.pieces,
    repeatMm: periodMm === null ? null : periodMm.toFixed(1),
    lengthMm: needed === null || periodMm === null ? null : (needed * periodMm).toFixed(0),
    offcut: last > 0 && last < source.pieces ? (offcutAfter?.(last) ?? null) : null,
  };
}

/** Every lot once: what goes under the press in strips gives what its strips give. */
function rackLots(sources: readonly AdvisedSource[]): RackLot[] {
  const lots = new Map<number, RackLot>();
  for (const { source, shown } of sources) {
    const { lotId, tag } = shown;
    if (lotId !== null && tag !== null) lots.set(lotId, { lotId, tag, pieces: source.pieces });
  }
  return [...lots.values()];
}
