import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  count,
  lengthMm,
  line,
  money,
  optionalLine,
  paragraph,
  percent,
  unitPrice,
  version,
} from './fields.ts';
import { priceRule } from './price-rule.ts';

const hoursPerDay = z
  .string()
  .regex(/^(1?\d|2[0-4])(\.\d{1,2})?$/, 'Enter hours from 0 to 24, such as 6 or 7.5.')
  .refine((text) => Number(text) <= 24, 'Enter hours from 0 to 24, such as 6 or 7.5.');

const timeZone = z.string().refine(isTimeZone, 'Choose a time zone, such as Europe/Lisbon.');

function isTimeZone(name: string): boolean {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
}

export const stockValues = ['moving average', 'first in first out'] as const;

const settings = {
  name: line(80, 'Enter the name of the shop.'),
  currency: z.string().regex(/^[A-Z]{3}$/, 'Choose a currency.'),
  areaUnit: z.enum(['ft2', 'dm2', 'm2']),
  /** How finely areas on the rack are shown where they are in ft². */
  areaShown: z.enum(['tenth', 'quarter'], 'Choose tenths or quarters.'),
  lengthUnit: z.enum(['mm', 'in']),
  timeZone,
  targetPerHour: money,
  wagePerHour: money,
  deskMinutesPerOrder: count.max(10_000, 'Enter at most 10,000 minutes.'),
  packingPerOrder: money,
  rejectPercent: percent.refine((text) => Number(text) < 99, 'Enter less than 99 %.'),
  confidencePercent: percent.refine(
    (text) => Number(text) >= 50 && Number(text) < 100,
    'Enter a share from 50 to below 100 %.',
  ),
  priceStep: money.refine((text) => Number(text) > 0, 'Enter a step above 0, such as 0.05.'),
  benchHoursPerDay: hoursPerDay,
  spacingMm: lengthMm,
  trimMm: lengthMm,
  depositPercent: percent,
  quoteValidDays: count.min(1, 'Enter 1 day or more.').max(730, 'Enter at most 730 days.'),
  /** Least that may be paid for an hour here; 0 where nobody said. */
  minimumWagePerHour: money,
  restPercent: percent,
  overheadPerHour: money,
  packingPerPiece: unitPrice,
  cardFeePercent: percent.refine((text) => Number(text) <= 50, 'Enter at most 50 %.'),
  cardFeeEach: money,
  setUpCharge: money,
  minimumOrder: money,
  priceRule,
  /** How hardware and supplies are valued from now on; a lot stands at its own cost. */
  stockValue: z.enum(stockValues, 'Choose how stock is valued.'),
  paymentTermDays: count.max(365, 'Enter at most 365 days.'),
  address: paragraph(400),
  taxNumber: optionalLine(40),
  /** How far a side may miss the area marked on it before the receipt says so. */
  areaTolerancePercent: percent,
  /** How sure stock should last until a delivery comes. */
  servicePercent: percent.refine(
    (text) => Number(text) >= 50 && Number(text) < 100,
    'Enter a share from 50 to below 100 %.',
  ),
  /** Of placing one order with a supplier. */
  orderCost: money.refine((text) => Number(text) > 0, 'Enter a cost above 0, such as 10.'),
  /** Keeping a thing for a year costs this share of its price. */
  holdingPercent: percent.refine((text) => Number(text) > 0, 'Enter a share above 0, up to 100 %.'),
};

export const workshop = z
  .object({
    name: z.string(),
    currency: z.string(),
    areaUnit: settings.areaUnit,
    areaShown: settings.areaShown,
    lengthUnit: settings.lengthUnit,
    timeZone: z.string(),
    targetPerHour: confidential(z.string()),
    wagePerHour: confidential(z.string()),
    deskMinutesPerOrder: z.int(),
    packingPerOrder: confidential(z.string()),
    rejectPercent: z.string(),
    confidencePercent: z.string(),
    priceStep: confidential(z.string()),
    benchHoursPerDay: z.string(),
    spacingMm: z.string(),
    trimMm: z.string(),
    depositPercent: confidential(z.string()),
    quoteValidDays: z.int(),
    minimumWagePerHour: confidential(z.string()),
    restPercent: z.string(),
    overheadPerHour: confidential(z.string()),
    packingPerPiece: confidential(z.string()),
    cardFeePercent: confidential(z.string()),
    cardFeeEach: confidential(z.string()),
    setUpCharge: confidential(z.string()),
    minimumOrder: confidential(z.string()),
    priceRule: confidential(priceRule),
    stockValue: confidential(z.enum(stockValues)),
    paymentTermDays: z.int(),
    address: z.string(),
    taxNumber: confidential(z.string()),
    areaTolerancePercent: z.string(),
    servicePercent: z.string(),
    orderCost: confidential(z.string()),
    holdingPercent: z.string(),
    mode: z.enum(['demo', 'shop']),
    /** Whether mail can leave; papers are handed over by hand while it cannot. */
    mailAvailable: z.boolean(),
    version,
  })
  .meta({ id: 'Workshop' });
export type Workshop = z.infer<typeof workshop>;

export const readWorkshop = endpoint({
  method: 'GET',
  path: '/workshop',
  summary: 'The shop and its starting values',
  access: ['owner', 'maker', 'bookkeeper'],
  reply: workshop,
});

export const changeWorkshop = endpoint({
  method: 'PATCH',
  path: '/workshop',
  summary: 'Change the shop’s starting values',
  access: ['owner'],
  edits: true,
  body: z.strictObject(settings).partial(),
  reply: workshop,
});
