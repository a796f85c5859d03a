import { compute } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

describe('learning', () => {
  // An 80 % curve by units (Crawford), as in the tables of Heizer and Render (from memory),
  // recomputed with SciPy 1.17.1: unit, total.
  it.each([
    [1, 1, 1],
    [2, 0.8, 1.8],
    [3, 0.7021037027785602, 2.50210370277856],
    [4, 0.64, 3.1421037027785603],
    [5, 0.5956373436127806, 3.737741046391341],
    [6, 0.5616829622228482, 4.2994240086141895],
    [7, 0.5344895246561236, 4.833913533270313],
    [8, 0.512, 5.345913533270313],
    [9, 0.49294960945536476, 5.838863142725677],
    [10, 0.4765098748902245, 6.315373017615902],
    [25, 0.3547838451060897, 12.308595987867095],
    [50, 0.2838270760848718, 20.12171376147918],
    [100, 0.22706166086789742, 32.65081083318005],
  ])('by units: the %i. takes %f, all so far %f', (n, unit, total) => {
    const answer = compute('learning', { model: 'unit', curve: 0.8, n });
    expect(answer).toEqual({
      unit: expect.closeTo(unit, 12),
      average: expect.closeTo(total / n, 12),
      total: expect.closeTo(total, 11),
    });
  });

  // An 80 % curve by cumulative averages (Wright), recomputed: average, unit, total.
  it.each([
    [1, 1, 1, 1],
    [2, 0.8, 0.6, 1.6],
    [3, 0.7021037027785602, 0.5063111083356806, 2.1063111083356807],
    [4, 0.64, 0.45368889166431936, 2.56],
    [5, 0.5956373436127806, 0.41818671806390295, 2.978186718063903],
    [10, 0.4765098748902245, 0.32855226380396196, 4.765098748902245],
    [100, 0.22706166086789742, 0.15421305827537068, 22.706166086789743],
  ])('by averages: the first %i take %f each, the last one %f', (n, average, unit, total) => {
    const answer = compute('learning', { model: 'cumulative', curve: 0.8, n });
    expect(answer).toEqual({
      unit: expect.closeTo(unit, 12),
      average: expect.closeTo(average, 12),
      total: expect.closeTo(total, 12),
    });
  });

  // An example of a course in project management: 812 hours for the first at 75 %, 82.1 for the 250th.
  it('by units at 75 %: 812 hours for the first are 82.1 for the 250th', () => {
    const { unit } = compute('learning', { model: 'unit', curve: 0.75, n: 250 }) as {
      unit: number;
    };
    expect(812 * unit).toBeCloseTo(82.09581234900766, 10);
  });

  // Exponents log₂ of the curve, recomputed: the second unit takes 2^b, the fourth 4^b.
  it.each([
    [0.7, -0.5145731728297583],
    [0.75, -0.4150374992788438],
    [0.85, -0.23446525363702297],
    [0.9, -0.15200309344504997],
    [0.95, -0.07400058144377693],
  ])('on a curve of %f has the exponent %f', (curve, exponent) => {
    const answer = compute('learning', { model: 'unit', curve, n: 1000 });
    expect(answer).toMatchObject({ unit: expect.closeTo(1000 ** exponent, 12) });
  });
});

describe('flow time', () => {
  // One machine per step, recomputed by simulation.
  it.each([
    [100, [1, 1, 1], 100, 300],
    [100, [1, 1, 1], 20, 140],
    [100, [1, 1, 1], 1, 102],
    [100, [1, 2, 1], 100, 400],
    [100, [1, 2, 1], 20, 240],
    [100, [1, 2, 1], 1, 202],
    [50, [2, 3, 1, 2], 50, 400],
    [50, [2, 3, 1, 2], 10, 200],
    [50, [2, 3, 1, 2], 1, 155],
    [10, [5, 5, 5, 5], 10, 200],
    [10, [5, 5, 5, 5], 2, 80],
    [10, [5, 5, 5, 5], 1, 65],
  ])('of %i pieces through %j, %i at a time, is %i', (quantity, times, transfer, makespan) => {
    expect(compute('flow-time', { quantity, times, transfer })).toEqual({ makespan });
  });
});

const yearly = (outlay: string, income: string, years: number): string[] => [
  outlay,
  ...Array.from({ length: years }, () => income),
];

describe('does the machine pay', () => {
  // OpenStax, Principles of Accounting 2, §11.4: the book's own answers come from four-digit tables
  // (68,400; 7,860; 16,640); these are exact, recomputed.
  it.each([
    [0.08, yearly('-200000', '40000', 10), '68403.26'],
    [0.05, yearly('-50000', '10000', 7), '7863.73'],
    [0.1, yearly('-135000', '40000', 5), '16631.47'],
  ])('at %f the flows %j are worth %s', (rate, flows, value) => {
    expect(compute('present-value', { rate, flows })).toEqual({ value });
  });

  // The same, §11.2: 150,000 that bring 20,000 a year are back after 7.5 years.
  it('is back after 7.5 years', () => {
    expect(compute('payback', { flows: yearly('-150000', '20000', 10) })).toEqual({ years: 7.5 });
  });

  // The rate of return at which nothing is left, recomputed: 15.098 % for the first one above.
  it('is worth nothing at its own rate of return', () => {
    const flows = yearly('-200000', '40000', 10);
    expect(compute('present-value', { rate: 0.1509841447711284, flows })).toEqual({
      value: '0.00',
    });
  });
});

describe('which stamp metal pays', () => {
  // Common practice, no source: magnesium lasts some 10,000 strikes, brass some 100,000 at five to
  // ten times the price.
  const plates = [
    { metal: 'magnesium', price: '40.00', life: 10_000 },
    { metal: 'brass', price: '300.00', life: 100_000 },
  ];

  it.each([
    [2_000, { metal: 'magnesium', cost: '40.00', plates: 1 }],
    [70_000, { metal: 'magnesium', cost: '280.00', plates: 7 }],
    [70_001, { metal: 'brass', cost: '300.00', plates: 1 }],
  ])('for %i strikes', (impressions, answer) => {
    expect(compute('plate-choice', { impressions, plates })).toEqual(answer);
  });
});

describe('price breaks', () => {
  // Worked out by hand: from 81 pieces at 10.00 on, 100 at 8.00 are 800.00 and cost less; 99 would
  // be 990.00. From 200 on the price rises again.
  it('say where ordering more costs less, and where the price rises', () => {
    const breaks = [
      { from: 1, price: '10.00' },
      { from: 100, price: '8.00' },
      { from: 200, price: '8.50' },
    ];
    expect(compute('price-breaks', { breaks })).toEqual({
      inversions: [{ from: 81, until: 99, saves: '190.00' }],
      risesAt: [200],
    });
  });
});
