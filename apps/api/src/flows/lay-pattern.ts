import type { PatternDefinition } from '@hidewright/contract';
import type { Context } from '../context.ts';
import { invalid, type Problem } from '../http/problem.ts';
import { layoutsFor, requirePieces, type WorkedLayout } from '../modules/layouts/stored-layouts.ts';

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
  context: Layer,
  patternId: number,
  missing: Problem = choosePattern(),
): Promise<LaidPattern> {
  const [laid] = await layPatterns(context, [patternId], () => missing);
  return laid as LaidPattern;
}

type Layer = Pick<Context, 'orm' | 'workers'>;

/**
 * Those of several at once, in their order.
 * @param missing what to refuse with for the pattern at this place
 */
export async function layPatterns(
  context: Layer,
  patternIds: readonly number[],
  missing: (at: number) => Problem,
): Promise<LaidPattern[]> {
  const rows = await context.orm.em.execute<Row[]>(latest, [JSON.stringify(patternIds)]);
  const named = patternIds.map((id, at) => {
    const row = rows.find(({ patternId }) => patternId === id);
    if (row === undefined) throw missing(at);
    return { ...row, definition: JSON.parse(row.definition) as PatternDefinition };
  });
  const layouts = await layoutsFor(
    context,
    named.map(({ definition }) => definition),
  );
  return named.map((pattern, at) => {
    const worked = layouts[at] as WorkedLayout;
    requirePieces(worked.layout);
    return { ...pattern, worked };
  });
}

type Row = Pick<LaidPattern, 'patternId' | 'patternName' | 'versionId' | 'versionNumber'> & {
  definition: string;
};

const latest = `SELECT p.id AS patternId, p.name AS patternName, v.id AS versionId, v.number AS versionNumber, v.definition
  FROM pattern p JOIN pattern_version v ON v.pattern_id = p.id AND v.number = p.latest_version
  WHERE p.id IN (SELECT value FROM json_each(?))`;

const choosePattern = () =>
  invalid([{ field: 'patternId', message: 'Choose a pattern from the list, or make a new one.' }]);
