import { z } from 'zod';
import { endpoint } from './endpoint.ts';

const mm = (word: string, min: number, max: number) =>
  z.coerce
    .number(`Enter the ${word} in mm.`)
    .min(min, `Enter the ${word}, from ${min} to ${max} mm.`)
    .max(max, `Enter the ${word}, from ${min} to ${max} mm.`);

const many = (word: string) =>
  z.coerce
    .number(`Enter how many ${word}.`)
    .int(`Enter how many ${word}.`)
    .min(1, `Enter how many ${word}, 1 to 30.`)
    .max(30, `Enter how many ${word}, 1 to 30.`);

const ids = z
  .string()
  .regex(/^$|^\d{1,9}(,\d{1,9}){0,199}$/, 'Choose at most 200 tags at a time.')
  .default('')
  .transform((text) => (text === '' ? [] : [...new Set(text.split(',').map(Number))]));

/** What is printed, and how the sheet of labels is measured. */
export const labelSheet = z.strictObject({
  lots: ids,
  hardware: ids,
  page: z.enum(['a4', 'letter'], 'Choose A4 or Letter.').default('a4'),
  columns: many('stand side by side').default(2),
  rows: many('stand one below the other').default(6),
  widthMm: mm('width of a label', 25, 210).default(90),
  heightMm: mm('height of a label', 18, 290).default(44),
  leftMm: mm('margin at the left', 0, 100).default(12),
  topMm: mm('margin above', 0, 100).default(12),
  gapAcrossMm: mm('gap between two columns', 0, 50).default(6),
  gapDownMm: mm('gap between two rows', 0, 50).default(2),
  start: z.coerce
    .number('Enter at which label to begin.')
    .int('Enter at which label to begin.')
    .min(1, 'Enter 1 for a whole sheet.')
    .default(1),
});

export const printLabels = endpoint({
  method: 'GET',
  path: '/labels/file',
  summary: 'Tags of lots and bins with their codes, on a sheet of labels, true to size',
  access: ['owner', 'maker'],
  query: labelSheet,
  file: 'application/pdf',
  reply: z.unknown(),
});
