import { countWords } from '../numbers/count-words.ts';

interface NamedPart {
  name: string;
  /** In one kit. */
  quantity: number;
}

/** What a kit is made up of: "a kit of 1 × Cap 9 mm and 2 × Washer". */
export function kitWords(parts: readonly NamedPart[]): string {
  const said = parts.map(({ name, quantity }) => `${countWords(quantity)} × ${name}`);
  const last = said.pop() ?? '';
  return `a kit of ${said.length === 0 ? '' : `${said.join(', ')} and `}${last}`;
}

/** How many whole kits there are of what is there of each part. */
export const wholeKits = (parts: readonly { quantity: number; there: number }[]): number =>
  Math.min(...parts.map(({ quantity, there }) => Math.floor(there / quantity)));
