import { priceRun, quantityThatReaches, straightLine, type RunInput } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

/** A run that is nothing but what a case puts in. */
const bare: RunInput = {
  breaks: [{ quantity: 1, typedPrice: null }],
  confidencePercent: '95',
  layout: { form: 'panel', pieces: 1, containerAreaMm2: '92903.04' },
  leather: { name: 'None', pricePerFt2: '0' },
  hardware: [],
  tooling: [],
  work: { kind: 'minutesPer100', minutes: '6000', rejectPercent: '0' },
  wagePerHour: '0',
  deskMinutesPerOrder: '0',
  packingPerOrder: '0',
  targetPerHour: '0',
  priceStep: '0.01',
  minorDigits: 2,
};
const supply = (name: string, unitPrice: string, per: 'piece' | 'run') => ({
  ...{ name, unitPrice, per },
  quantity: '1',
});
const amounts = (input: RunInput) =>
  (priceRun(input).breaks[0]?.costLines ?? []).map(({ amount }) => Number(amount));
const sum = (values: number[]) => values.reduce((total, each) => total + each, 0);

// OpenStax, Principles of Accounting, Volume 2: the numbers of its examples.
describe('the cost of a job', () => {
  // §4.5, job MAC001: materials 700, labour 66, overhead at 250,000 / 100,000 = 2.50 of labour: 165. The picture's
  // text alternative prints the rate as 1.50, which is a misprint: 66 × 1.50 would be 99.
  it('is materials, labour and overhead: 700 + 66 + 165 = 931', () => {
    const materials = [300, 100, 60, 60, 120, 60];
    const job = {
      ...bare,
      supplies: materials.map((cost, at) => supply(`Material ${at + 1}`, String(cost), 'run')),
      wagePerHour: '66',
      overheadPerHour: String((66 * 250_000) / 100_000),
    };
    const lines = amounts(job);
    expect(sum(lines.filter((each) => materials.includes(each)))).toBe(700);
    expect(sum(lines)).toBe(931);
  });
});

describe('the break-even', () => {
  // §3.2: sold at 100, variable cost 20, fixed cost 18,000.
  const plant = {
    ...bare,
    supplies: [supply('Variable cost', '20', 'piece'), supply('Fixed', '18000', 'run')],
  };
  it('is 225 units, at 22,500 of sales', () => {
    expect(quantityThatReaches(plant, '100')).toBe(225);
    expect(225 * 100).toBe(22_500);
  });
  it.each([
    [175, -4000],
    [300, 6000],
    [425, 16_000],
  ])('with %i units %f is left', (quantity, left) => {
    const { breaks } = priceRun({ ...plant, breaks: [{ quantity, typedPrice: '100' }] });
    expect(Number(breaks[0]?.left)).toBe(left);
  });
  it('with tax of 40 % and 24,000 wanted after it is 725 units', () => {
    const wanted = 24_000 / (1 - 0.4);
    const withProfit = supply('Fixed and wanted', String(18_000 + wanted), 'run');
    const supplies = [supply('Variable cost', '20', 'piece'), withProfit];
    expect(quantityThatReaches({ ...plant, supplies }, '100')).toBe(725);
  });
});

describe('a special order', () => {
  // §10.2: 1,650 of variable cost a unit offered 1,800; then 160,000 more of cost over 800 of them, 200 each.
  const leftEach = (supplies: ReturnType<typeof supply>[]) => {
    const { breaks } = priceRun({
      ...bare,
      supplies,
      breaks: [{ quantity: 800, typedPrice: '1800' }],
    });
    return Number(breaks[0]?.left) / 800;
  };
  it('leaves 150 each, and costs 50 each once more must be bought for it', () => {
    expect(leftEach([supply('Variable cost', '1650', 'piece')])).toBe(150);
    const more = supply('More machines', '160000', 'run');
    expect(leftEach([supply('Variable cost', '1650', 'piece'), more])).toBe(-50);
  });
});

describe('the straight line', () => {
  // Volume 1, §11.3: 58,000 bought, 10,000 left after five years.
  it('writes 9,600 a year off', () => {
    expect(straightLine({ price: '58000', salvage: '10000', years: 5 })).toBe('9600.00');
  });
});

describe('markup and margin', () => {
  // m on cost is m / (1 + m) of the price; 100 % is keystone: the price is twice the cost.
  it.each([
    ['25', '20.00'],
    ['50', '33.33'],
    ['100', '50.00'],
    ['200', '66.67'],
    ['300', '75.00'],
  ])('%s %% on cost is %s %% of the price', (markup, margin) => {
    const goods = {
      ...bare,
      supplies: [supply('Goods', '60', 'piece')],
      breaks: [{ quantity: 100, typedPrice: null }],
    };
    const priceOf = (priceRule: RunInput['priceRule']) =>
      Number(priceRun({ ...goods, priceRule }).breaks[0]?.priceEach);
    const price = priceOf({ kind: 'markup', percent: markup });
    expect(price).toBe(60 * (1 + Number(markup) / 100));
    expect((100 * (price - 60)) / price).toBeCloseTo(Number(margin), 2);
    expect(priceOf({ kind: 'margin', percent: margin })).toBeCloseTo(price, 0);
  });
});
