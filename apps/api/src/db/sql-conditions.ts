/** One condition of a query written by hand; what a person typed goes into `values`, never into `sql`. */
interface Condition {
  sql: string;
  values: readonly (string | number | null)[];
}

/** The condition where it is asked for. */
export function when<T extends string | number>(
  value: T | null | undefined,
  sql: string,
  written: (value: T) => Condition['values'] = (value) => [value],
): Condition[] {
  return value === undefined || value === null ? [] : [{ sql, values: written(value) }];
}

/** All conditions as one WHERE clause, empty where there is none, with its values. */
export function whereAll(conditions: readonly Condition[]): {
  where: string;
  values: (string | number | null)[];
} {
  const sql = conditions.map((condition) => `(${condition.sql})`).join(' AND ');
  return {
    where: sql === '' ? '' : `WHERE ${sql}`,
    values: conditions.flatMap((condition) => condition.values),
  };
}
