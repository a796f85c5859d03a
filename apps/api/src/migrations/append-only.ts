/** Triggers that keep a ledger's rows as they were written: a correction is a new row. */
export function appendOnly(table: string): string[] {
  return (['UPDATE', 'DELETE'] as const).map(
    (verb) => `CREATE TRIGGER ${table}_refuses_${verb.toLowerCase()} BEFORE ${verb} ON ${table}
      BEGIN SELECT RAISE(ABORT, '${table} is append-only'); END`,
  );
}
