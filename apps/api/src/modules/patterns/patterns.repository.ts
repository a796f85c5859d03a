import type { FilterQuery } from '@mikro-orm/core';
import type {
  Pattern as PatternReply,
  PatternDefinition,
  PatternSummary,
} from '@hidewright/contract';
import type { Layout } from '@hidewright/domain';
import type { Work } from '../../work.ts';
import { StoredLayout } from '../layouts/layout.entity.ts';
import { layoutHash, pathOfDefinition } from '../layouts/stored-layouts.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { describeDefinition } from './describe-definition.ts';
import { describeHardware } from './describe-hardware.ts';
import { PatternVersion } from './pattern-version.entity.ts';
import { definitionOf } from './pattern-versions.ts';
import { Pattern } from './pattern.entity.ts';

interface Wanted {
  below: number | undefined;
  q: string | undefined;
  active: boolean | undefined;
  limit: number;
}

/** One row more than a page, so that `toPage` sees whether there is another. */
export async function listPatterns({ em }: Work, wanted: Wanted): Promise<Pattern[]> {
  const where: FilterQuery<Pattern> = {
    ...(wanted.below === undefined ? {} : { id: { $lt: wanted.below } }),
    ...(wanted.q === undefined ? {} : { name: { $like: `%${wanted.q}%` } }),
    ...(wanted.active === undefined ? {} : { active: wanted.active }),
  };
  return em.find(Pattern, where, { orderBy: { id: 'desc' }, limit: wanted.limit + 1 });
}

/** The patterns of a page with what their latest versions say, read in four queries however many they are. */
export async function summarise({ em }: Work, patterns: Pattern[]): Promise<PatternSummary[]> {
  const versions = await em.find(PatternVersion, {
    $or: patterns.map(({ id, latestVersion }) => ({ patternId: id, number: latestVersion })),
  });
  const designs = versions.map((version) => {
    const definition = definitionOf(version);
    return { version, definition, hash: layoutHash(definition) };
  });
  const layouts = await em.find(StoredLayout, {
    inputHash: { $in: designs.map(({ hash }) => hash) },
  });
  const leathers = await em.find(Leather, {
    id: { $in: designs.map(({ definition }) => definition.leatherId) },
  });
  return patterns.flatMap((pattern) => {
    const design = designs.find(({ version }) => version.patternId === pattern.id);
    if (design === undefined) return [];
    const stored = layouts.find(({ inputHash }) => inputHash === design.hash);
    const leather = leathers.find(({ id }) => id === design.definition.leatherId);
    return [toSummary(pattern, design, stored?.result as Layout | undefined, leather?.name ?? '')];
  });
}

function toSummary(
  pattern: Pattern,
  { version, definition }: { version: PatternVersion; definition: PatternDefinition },
  layout: Layout | undefined,
  leatherName: string,
): PatternSummary {
  return {
    id: pattern.id,
    name: pattern.name,
    active: pattern.active,
    versionNumber: version.number,
    description: describeDefinition(definition),
    leatherName,
    outlinePath: pathOfDefinition(definition),
    pieces: layout?.pieces ?? null,
    yieldPercent: layout?.yieldPercent ?? null,
    form: layout?.container.form ?? 'panel',
    changedAt: version.createdAt,
  };
}

/** One pattern as it is now, in full. */
export async function describePattern(
  { em }: Work,
  pattern: Pattern,
  version: PatternVersion,
  layout: Layout,
): Promise<PatternReply> {
  const definition = definitionOf(version);
  const leather = await em.findOne(Leather, definition.leatherId);
  return {
    id: pattern.id,
    name: pattern.name,
    active: pattern.active,
    versionNumber: version.number,
    definition,
    leatherName: leather?.name ?? '',
    hardware: await describeHardware(em, definition, leather),
    description: describeDefinition(definition),
    outlinePath: pathOfDefinition(definition),
    layout,
    changedAt: version.createdAt,
    changedBy: version.createdBy,
    version: pattern.version,
  };
}
