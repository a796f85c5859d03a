import type { PatternDefinition } from '@hidewright/contract';
import type { Context } from '../context.ts';
import { invalid, type Problem } from '../http/problem.ts';
import { layoutFor, requirePieces, type WorkedLayout } from '../modules/layouts/stored-layouts.ts';

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
  const [row] = await context.orm.em.fork().execute<[Row | undefined]>(latest, [patternId]);
  if (row === undefined) throw missing;
  const { definition: text, ...named } = row;
  const definition = JSON.parse(text) as PatternDefinition;
  const worked = await layoutFor(context, definition);
  requirePieces(worked.layout);
  return { patternId, ...named, definition, worked };
}

type Row = Pick<LaidPattern, 'patternName' | 'versionId' | 'versionNumber'> & {
  definition: string;
};

/** One row, since every quote and check begins with it. */
const latest = `SELECT p.name AS patternName, v.id AS versionId, v.number AS versionNumber, v.definition
  FROM pattern p JOIN pattern_version v ON v.pattern_id = p.id AND v.number = p.latest_version WHERE p.id = ?`;

const choosePattern = () =>
  invalid([{ field: 'patternId', message: 'Choose a pattern from the list, or make a new one.' }]);
