export interface CreditorReference {
  /** whether the text itself is a reference with the right check digits */
  valid: boolean;
  /** without blanks, in capitals; null where the text is no reference and none can be made of it */
  reference: string | null;
}

const longestBody = 21;

/**
 * Judges a structured creditor reference of ISO 11649, or makes one. A text that begins with RF is
 * judged: RF, two check digits (ISO 7064 MOD 97-10, so 02 to 98) and 1 to 21 letters or digits, with
 * blanks between as one likes. A wrong one is not mended, since nobody knows which character is
 * wrong. Any other text, such as the number of an invoice, is not valid itself, and gets its
 * reference made; blanks, hyphens, points and strokes in it are dropped.
 */
export function creditorReference(text: string): CreditorReference {
  const written = text.replace(/\s/g, '').toUpperCase();
  if (!written.startsWith('RF')) return { valid: false, reference: make(written) };
  const made = /^RF\d\d/.test(written) ? make(written.slice(4), /^$/) : null;
  const valid = made === written;
  return { valid, reference: valid ? made : null };
}

function make(text: string, dropped = /[-./]/g): string | null {
  const body = text.replace(dropped, '');
  if (!/^[0-9A-Z]+$/.test(body) || body.length > longestBody) return null;
  const check = 98 - remainder97(`${body}RF00`);
  return `RF${String(check).padStart(2, '0')}${body}`;
}

/** The text as a number, with A = 10 … Z = 35, modulo 97. */
function remainder97(text: string): number {
  return [...text].reduce((rest, character) => {
    const value = Number.parseInt(character, 36);
    return (rest * (value < 10 ? 10 : 100) + value) % 97;
  }, 0);
}
