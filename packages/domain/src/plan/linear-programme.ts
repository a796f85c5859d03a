/** Maximise `gain` · x with each x between its bounds and each row · x between the row's. */
export interface LinearProgramme {
  gain: readonly number[];
  /** `most` null: no upper bound */
  bounds: readonly { least: number; most: number | null }[];
  rows: readonly LinearRow[];
}

export interface LinearRow {
  of: readonly number[];
  least: number | null;
  most: number | null;
}

export interface LinearAnswer {
  x: number[];
  /** by how much the gain grows with each row's bound, for a little of it */
  duals: number[];
}

/** Null where no x keeps every bound. */
export type LinearSolver = (programme: LinearProgramme) => LinearAnswer | null;

/** A linear programme as text in the LP format (IBM, CPLEX file formats), x0, x1 … its variables. */
export function lpText({ gain, bounds, rows }: LinearProgramme): string {
  const lines = rows.flatMap(({ of, least, most }, at) => [
    ...(most === null ? [] : [` most${at}: ${sum(of)} <= ${most}`]),
    ...(least === null ? [] : [` least${at}: ${sum(of)} >= ${least}`]),
  ]);
  const limits = bounds.map(({ least, most }, at) =>
    most === null ? ` x${at} >= ${least}` : ` ${least} <= x${at} <= ${most}`,
  );
  return [
    'Maximize',
    ` gain: ${sum(gain)}`,
    'Subject To',
    ...lines,
    'Bounds',
    ...limits,
    'End',
    '',
  ].join('\n');
}

/** One term a line, since readers of the format may cut long lines. */
const sum = (of: readonly number[]): string =>
  of.map((each, at) => `${each < 0 ? '-' : '+'} ${Math.abs(each)} x${at}`).join('\n  ');

/** What a solver of such text answers, by the names that `lpText` gave. */
export interface LpAnswer {
  Status: string;
  Columns: Record<string, { Index: number; Primal?: number }>;
  Rows: readonly { Index: number; Name?: string; Dual?: number }[];
}

/** @throws Error where the solver found neither the best x nor that there is none: a fault, not an answer */
export function readLpAnswer(
  { gain, rows }: LinearProgramme,
  answer: LpAnswer,
): LinearAnswer | null {
  if (answer.Status === 'Infeasible') return null;
  if (answer.Status !== 'Optimal') throw new Error(`The solver ended as ${answer.Status}.`);
  const dual = (name: string) => answer.Rows.find(({ Name }) => Name === name)?.Dual ?? 0;
  return {
    x: gain.map((_, at) => answer.Columns[`x${at}`]?.Primal ?? 0),
    duals: rows.map((_, at) => dual(`most${at}`) + dual(`least${at}`)),
  };
}
