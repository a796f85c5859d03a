import type { PatternDefinition } from '@hidewright/contract';
import type { Context } from '../context.ts';
import { invalid, type Problem } from '../http/problem.ts';
import { layoutFor, requirePieces, type WorkedLayout } from '../modules/layouts/stored-layouts.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';

/** The version of a pattern that a quote is made with, and how its pieces lie. */
export interface LaidPattern {
  patternId: number;
  patternName: string;
  versionId: number;
  versionNumber: number;
  definition: PatternDefinition;
  worked: WorkedLayout;
}

/**
 * A pattern's latest version with its layout. Versions never change, so this may come before the transaction that
 * uses it; a worker may have to work the layout out.
 * @param missing what to refuse with when there is no such pattern
 * @throws {Problem} 422 when there is no such pattern, or not one piece fits
 */
export async function layPattern(
  context: Pick<Context, 'orm' | 'workers'>,
  patternId: number,
  missing: Problem = choosePattern(),
): Promise<LaidPattern> {
  const em = context.orm.em.fork();
  const pattern = await em.findOne(Pattern, patternId);
  if (pattern === null) throw missing;
  const version = await em.findOneOrFail(PatternVersion, {
    patternId,
    number: pattern.latestVersion,
  });
  const definition = version.definition as PatternDefinition;
  const worked = await layoutFor(context, definition);
  requirePieces(worked.layout);
  return {
    patternId,
    patternName: pattern.name,
    versionId: version.id,
    versionNumber: version.number,
    definition,
    worked,
  };
}

const choosePattern = () =>
  invalid([{ field: 'patternId', message: 'Choose a pattern from the list, or make a new one.' }]);
