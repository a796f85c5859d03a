import type { LayoutInput, SideInput } from './layout.ts';

/** Raised whenever the same input may give another layout, so that stored ones are worked out anew. */
const engine = 2;

/** The same text for the same input, whatever the order of its fields: to be hashed as a key. */
export function layoutInputKey(input: LayoutInput | SideInput): string {
  return JSON.stringify([engine, sorted(input)]);
}

function sorted(value: unknown): unknown {
  if (typeof value !== 'object' || value === null) return value;
  return Object.entries(value)
    .filter(([, each]) => each !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([name, each]) => [name, sorted(each)]);
}
