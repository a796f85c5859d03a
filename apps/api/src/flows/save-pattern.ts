import type { PatternDefinition } from '@hidewright/contract';
import { requireVersion } from '../http/conditions.ts';
import { requireFreeName } from '../http/free-name.ts';
import { invalid, type FieldFault } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { keepLayout, type WorkedLayout } from '../modules/layouts/stored-layouts.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import { withHistoryOf } from '../modules/patterns/pattern-history.ts';
import {
  definitionOf,
  findPattern,
  latestVersion,
  sameDefinition,
} from '../modules/patterns/pattern-versions.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import type { Work } from '../work.ts';

/**
 * Adds a pattern with its first version, and keeps its layout.
 * @param worked `await layoutFor(context, definition)`, before the transaction
 * @throws {Problem} 422 when the name is taken, or leather or hardware do not exist
 */
export async function addPattern(
  work: Work,
  asked: { name: string; definition: PatternDefinition },
  worked: WorkedLayout,
): Promise<Pattern> {
  await requireFreeName(work.em, Pattern, asked.name);
  await requireParts(work, asked.definition);
  const pattern = work.em.create(Pattern, { name: asked.name, latestVersion: 1 });
  await work.em.flush();
  await addVersion(work, pattern, asked.definition);
  await keepLayout(work, worked);
  await logDeed(work, {
    action: `added pattern ${pattern.name}`,
    subjectKind: 'pattern',
    subjectId: pattern.id,
  });
  return pattern;
}

/** What may change; what is not named stays. */
export interface PatternChange {
  name?: string | undefined;
  definition?: PatternDefinition | undefined;
  active?: boolean | undefined;
}

/**
 * Changes a pattern. A definition that says something new becomes a new version: quotes keep the version they were
 * made with.
 * @throws {Problem} 404, 412 when somebody changed it meanwhile, 422 as for a new one
 */
export async function changePattern(
  work: Work,
  asked: { id: number; ifMatch: number; change: PatternChange },
  worked: WorkedLayout,
): Promise<Pattern> {
  const pattern = await findPattern(work, asked.id);
  await requireVersion(
    work.em,
    { kind: 'pattern', id: pattern.id, version: pattern.version },
    asked.ifMatch,
  );
  if (asked.change.name !== undefined)
    await requireFreeName(work.em, Pattern, asked.change.name, pattern.id);
  if (asked.change.definition !== undefined) await requireParts(work, asked.change.definition);
  const { name = pattern.name, active = pattern.active } = asked.change;
  const before = definitionOf(await latestVersion(work, pattern));
  const definition = asked.change.definition && withHistoryOf(before, asked.change.definition);
  const redesigned = definition !== undefined && !sameDefinition(before, definition);
  if (!redesigned && name === pattern.name && active === pattern.active) return pattern;
  Object.assign(pattern, { name, active });
  if (redesigned) {
    pattern.latestVersion += 1;
    await addVersion(work, pattern, definition);
    await keepLayout(work, worked);
  }
  await work.em.flush();
  const action = redesigned
    ? `made version ${pattern.latestVersion} of pattern ${name}`
    : `changed pattern ${name}`;
  const detail = { changed: Object.keys(asked.change) };
  await logDeed(work, { action, subjectKind: 'pattern', subjectId: pattern.id, detail });
  return pattern;
}

async function addVersion(
  work: Work,
  pattern: Pattern,
  definition: PatternDefinition,
): Promise<void> {
  work.em.create(PatternVersion, {
    patternId: pattern.id,
    number: pattern.latestVersion,
    definition,
    createdAt: work.now.toISOString(),
    createdBy: work.actor.name,
  });
  await work.em.flush();
}

async function requireParts(
  { em }: Work,
  { leatherId, hardware, options = [] }: PatternDefinition,
): Promise<void> {
  const faults: FieldFault[] = [];
  if ((await em.count(Leather, { id: leatherId })) === 0) {
    faults.push({
      field: 'definition.leatherId',
      message: 'This leather is not there. Choose one from the list.',
    });
  }
  const named = [
    ...hardware.map(({ hardwareId }) => hardwareId),
    ...options.flatMap(({ swaps }) => swaps.flatMap(({ byHardwareId }) => byHardwareId ?? [])),
  ];
  const known = await em.find(Hardware, { id: { $in: named } });
  const gone = (id: number | null) => id !== null && !known.some((each) => each.id === id);
  const message = 'This hardware is not there. Choose one from the list.';
  hardware.forEach(({ hardwareId }, at) => {
    if (gone(hardwareId)) faults.push({ field: `definition.hardware.${at}.hardwareId`, message });
  });
  options.forEach(({ swaps }, option) =>
    swaps.forEach(({ byHardwareId }, at) => {
      const field = `definition.options.${option}.swaps.${at}.byHardwareId`;
      if (gone(byHardwareId)) faults.push({ field, message });
    }),
  );
  if (faults.length > 0) throw invalid(faults);
}
