import { patternDefinition, type PatternDefinition } from '@hidewright/contract';
import { notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { PatternVersion } from './pattern-version.entity.ts';
import { Pattern } from './pattern.entity.ts';

type Reader = Pick<Work, 'em'>;

/** @throws {Problem} 404 */
export async function findPattern({ em }: Reader, id: number): Promise<Pattern> {
  const pattern = await em.findOne(Pattern, id);
  if (pattern === null) throw notFound('pattern');
  return pattern;
}

/** The version that a pattern is made by today. */
export async function latestVersion({ em }: Reader, pattern: Pattern): Promise<PatternVersion> {
  return em.findOneOrFail(PatternVersion, { patternId: pattern.id, number: pattern.latestVersion });
}

/** A kept definition, read by today's schema. */
export function definitionOf(version: Pick<PatternVersion, 'definition'>): PatternDefinition {
  return patternDefinition.parse(version.definition);
}

/** Whether two definitions say the same. */
export function sameDefinition(one: PatternDefinition, other: PatternDefinition): boolean {
  return (
    JSON.stringify(patternDefinition.parse(one)) === JSON.stringify(patternDefinition.parse(other))
  );
}
