/** One wish of a linear programme: `by` · x ≥ `least`. */
export interface AtLeast {
  by: readonly number[];
  least: number;
}

/**
 * The x of least `cost` · x with every |x[i]| ≤ reach and all wishes kept; null where none is found.
 * Solves the dual by the simplex method: few rows, many columns, and a start at zero.
 */
export function linearStep(
  cost: readonly number[],
  wishes: readonly AtLeast[],
  reach: number,
): number[] | null {
  const signs = cost.map((each) => (each < 0 ? -1 : 1));
  const table = tableOf(cost, wishes, reach, signs);
  if (!pivotToTheEnd(table)) return null;
  const last = table.rows.length - 1;
  const first = wishes.length + cost.length;
  const profit = table.rows[last] as Float64Array;
  // The dual's prices are the distances from the corner where the start was made.
  return signs.map((sign, at) => sign * ((profit[first + at] as number) - reach));
}

interface Table {
  /** one row per unknown, then the row of profits; the last column is the right-hand side */
  rows: Float64Array[];
  columns: number;
}

function tableOf(
  cost: readonly number[],
  wishes: readonly AtLeast[],
  reach: number,
  signs: readonly number[],
): Table {
  const [size, many] = [cost.length, wishes.length];
  const columns = many + 2 * size;
  const rows = Array.from({ length: size + 1 }, () => new Float64Array(columns + 1));
  const profit = rows[size] as Float64Array;
  for (let at = 0; at < many; at += 1) {
    const { by, least } = wishes[at] as AtLeast;
    let right = least;
    for (let row = 0; row < size; row += 1) {
      const factor = (by[row] as number) * (signs[row] as number);
      (rows[row] as Float64Array)[at] = factor;
      right += factor * reach;
    }
    profit[at] = -right;
  }
  for (let row = 0; row < size; row += 1) {
    const line = rows[row] as Float64Array;
    line[many + row] = -1;
    line[many + size + row] = 1;
    line[columns] = Math.abs(cost[row] as number);
    profit[many + row] = 2 * reach;
  }
  return { rows, columns };
}

function pivotToTheEnd(table: Table): boolean {
  const mostPivots = 200 + 10 * table.rows.length;
  for (let turn = 0; turn < mostPivots; turn += 1) {
    const column = enteringColumn(table, turn > mostPivots / 2);
    if (column < 0) return true;
    const row = leavingRow(table, column);
    if (row < 0) return false;
    pivot(table, row, column);
  }
  return false;
}

/** The most profitable column; the first one (Bland's rule) once it may be going round in circles. */
function enteringColumn({ rows, columns }: Table, first: boolean): number {
  const profit = rows[rows.length - 1] as Float64Array;
  let [best, least] = [-1, -1e-9];
  for (let column = 0; column < columns; column += 1) {
    const value = profit[column] as number;
    if (value >= least) continue;
    if (first) return column;
    [best, least] = [column, value];
  }
  return best;
}

function leavingRow({ rows, columns }: Table, column: number): number {
  let [best, least] = [-1, Infinity];
  for (let row = 0; row < rows.length - 1; row += 1) {
    const line = rows[row] as Float64Array;
    const factor = line[column] as number;
    if (factor <= 1e-10) continue;
    const ratio = (line[columns] as number) / factor;
    if (ratio < least - 1e-12) [best, least] = [row, ratio];
  }
  return best;
}

function pivot({ rows, columns }: Table, row: number, column: number): void {
  const line = rows[row] as Float64Array;
  const factor = 1 / (line[column] as number);
  for (let at = 0; at <= columns; at += 1) line[at] = (line[at] as number) * factor;
  for (const other of rows) {
    if (other === line) continue;
    const times = other[column] as number;
    if (times === 0) continue;
    for (let at = 0; at <= columns; at += 1) {
      other[at] = (other[at] as number) - times * (line[at] as number);
    }
  }
}
