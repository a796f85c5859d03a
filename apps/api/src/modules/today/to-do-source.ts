import type { ToDo } from '@hidewright/contract';

export type Role = 'owner' | 'maker' | 'bookkeeper';

export interface Row {
  id: number;
  number: string;
  title: string;
  customer: string;
  day: string | null;
  extra: string | null;
}

/** Where a kind of thing to do comes from: its rows, most pressing first, and what to say of each. */
export interface Source {
  roles: readonly Role[];
  /** `:today` is the shop's calendar day. */
  sql: string;
  say: (row: Row, today: string) => ToDo;
}

export const by = (word: string, day: string | null) => (day === null ? null : { word, day });
export const past = (day: string | null, today: string) => day !== null && day < today;
