import { z } from 'zod';

/** Exact decimals travel as text. The patterns refuse NaN, exponents, minus nought and superfluous zeros. */
function decimalText(
  whole: number,
  places: number,
  example: string,
  sentence: string,
  signed = false,
) {
  const sign = signed ? '(?!-0(?:\\.0+)?$)-?' : '';
  const pattern = new RegExp(
    `^${sign}(0|[1-9]\\d{0,${whole - 1}})${places > 0 ? `(\\.\\d{1,${places}})?` : ''}$`,
  );
  return z.string(sentence).trim().regex(pattern, sentence).meta({ example });
}

/** An amount of money, in whole currency units with at most two decimals. */
export const money = decimalText(
  12,
  2,
  '420.00',
  'Enter an amount such as 12.50, not negative, with at most two decimals.',
);
/** An amount that may be negative, such as a loss. */
export const signedMoney = decimalText(
  13,
  2,
  '-3.20',
  'Enter an amount such as 12.50, with at most two decimals.',
  true,
);
/** A price or cost of one piece, foot or hour: at most four decimals. */
export const unitPrice = decimalText(
  9,
  4,
  '4.2',
  'Enter a price such as 0.17, not negative, with at most four decimals.',
);
/** An area in mm², to a thousandth. */
export const areaMm2 = decimalText(
  12,
  3,
  '1858060.8',
  'Enter an area such as 24.75, 24 3/4 or, in ft², 24³.',
);
export const signedAreaMm2 = decimalText(
  12,
  3,
  '-92903.04',
  'Enter an area in mm², with at most three decimals.',
  true,
);
/** A length in mm, to a millionth, so that a 64th of an inch is exact. */
export const lengthMm = decimalText(6, 6, '279.4', 'Enter a length such as 95 or 4 3/8.');
/** A length within limits; whatever is wrong with it, the sentence names it. */
export function lengthBetween(word: string, min: number, max: number) {
  const sentence = `Enter the ${word}, from ${min} to ${max} mm.`;
  const fits = (text: string) =>
    lengthMm.safeParse(text).success && Number(text) >= min && Number(text) <= max;
  return z.string(sentence).trim().refine(fits, sentence).meta({ example: '95' });
}

/** A share in per cent, 0 to 100. */
export const percent = decimalText(3, 4, '10', 'Enter a percentage from 0 to 100.').refine(
  (text) => Number(text) <= 100,
  'Enter a percentage from 0 to 100.',
);
export const minutes = decimalText(
  6,
  2,
  '30',
  'Enter minutes, not negative, with at most two decimals.',
);
export const seconds = decimalText(
  6,
  2,
  '4.5',
  'Enter seconds, not negative, with at most two decimals.',
);
export const ounces = decimalText(2, 3, '5.5', 'Enter a weight in ounces, such as 5 or 5.5.');
/** The weight of leather that was laid under a gauge. */
export const weighed = ounces.refine(
  (text) => Number(text) > 0,
  'Enter a weight above 0 oz, or leave it empty.',
);
/** An exact decimal that the program worked out. */
export const workedOut = z.string().meta({ example: '93.20' });

const wholeNumber = 'Enter a whole number.';
export const count = z
  .int(wholeNumber)
  .min(0, 'Enter 0 or more.')
  .max(10_000_000, 'That is too many.');
export const positiveCount = z
  .int(wholeNumber)
  .min(1, 'Enter 1 or more.')
  .max(10_000_000, 'That is too many.');
export const runQuantity = z
  .int(wholeNumber)
  .min(1, 'Enter 1 or more pieces.')
  .max(100_000, 'Enter at most 100,000 pieces.');
export const id = z.int().positive();
/** The id of something that a person chooses from a list. */
export const choice = (sentence: string) => z.int(sentence).positive(sentence);
export const version = z.int().positive();

/** A number of a paper, such as Q-0241. */
export const paperNumber = z.string().meta({ example: 'Q-0241' });

export const day = z.iso.date('Choose a day.').meta({ example: '2026-12-14' });
export const instant = z.string().meta({ example: '2026-12-01T08:40:00.000Z' });

const noControlCharacters = /^[^\p{Cc}]*$/u;
/** One line a person typed. */
export function line(longest: number, sentence: string) {
  return z
    .string(sentence)
    .trim()
    .min(1, sentence)
    .max(longest, `Keep it to ${longest} characters.`)
    .regex(noControlCharacters, 'Leave out line breaks and control characters.');
}
export function optionalLine(longest: number) {
  return z
    .string()
    .trim()
    .max(longest, `Keep it to ${longest} characters.`)
    .regex(noControlCharacters, 'Leave out line breaks and control characters.');
}
/** Several lines a person typed, such as a note or an address. */
export function paragraph(longest: number) {
  return z
    .string()
    .trim()
    .max(longest, `Keep it to ${longest} characters.`)
    .regex(/^(?:[^\p{Cc}]|[\n\r\t])*$/u, 'Leave out control characters.');
}
export const email = z.email('Enter an e-mail address such as name@example.com.').max(254);

export const idParams = z.strictObject({ id: z.coerce.number().int().positive() });

/** A page of a list: `next` is handed back as `cursor` for the page after it. */
export function page<T extends z.ZodType>(item: T) {
  return z.object({ items: z.array(item), next: z.string().nullable() });
}
export const pageQuery = z.strictObject({
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
  q: z.string().trim().max(100).optional(),
});
