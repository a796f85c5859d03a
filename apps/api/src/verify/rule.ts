/** Reads rows from the database under test; integers come as they are stored. */
export type Query = <Row>(sql: string) => Promise<Row[]>;

interface VerifiedFolder {
  query: Query;
  dataDir: string;
}

/** Something that must hold, and how to find where it does not: each fault is a sentence. */
export interface Rule {
  says: string;
  find: (folder: VerifiedFolder) => Promise<string[]>;
}

/** A rule whose faults are the rows of one query; each row's `fault` column is its sentence. */
export function none(says: string, sql: string): Rule {
  return {
    says,
    find: async ({ query }) => (await query<{ fault: string }>(sql)).map((row) => row.fault),
  };
}
