import { Decimal } from 'decimal.js';

type Read<Text> = Text extends string ? Decimal : Text;

/** Texts as the scaled columns take them; null and what was left out stay as they are. */
export function decimals<Texts extends Record<string, string | null | undefined>>(texts: Texts) {
  const read = Object.entries(texts).map(([name, text]) => [
    name,
    typeof text === 'string' ? new Decimal(text) : text,
  ]);
  return Object.fromEntries(read) as { [Name in keyof Texts]: Read<Texts[Name]> };
}
