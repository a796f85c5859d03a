import { compute, normalQuantile, productionLot } from '@hidewright/domain';
import jstat from 'jstat';
import { describe, expect, it } from 'vitest';

describe('how much to order', () => {
  // Harris, "How Many Parts to Make at Once", Factory 10 (1913): 1,000 a month, 2.00 to set up, 0.10
  // each, a tenth of it a year for keeping; printed 2,190.
  it('is 2,190 in the paper that began it', () => {
    const breaks = [{ from: 1, price: '0.10' }];
    const asked = { demand: 12_000, orderCost: '2.00', holdingRate: 0.1, breaks };
    expect(compute('eoq', asked)).toMatchObject({
      quantity: expect.closeTo(2190.8902300206646, 8),
    });
  });

  // Heizer and Render (from memory), recomputed: 200 at a time, five orders, 100.00 a year; made at
  // 8 a day and used at 4 a day, 282.8.
  it('is 200, or 282.8 made while used, in a textbook', () => {
    const answer = compute('eoq', { demand: 1000, orderCost: '10.00', holdingCost: '0.50' });
    expect(answer).toEqual({ quantity: 200, annualCost: '100.00' });
    const lot = { demand: 1000, setupCost: 10, holdingCost: 0.5, used: 4, made: 8 };
    expect(productionLot(lot)).toBeCloseTo(282.842712474619, 9);
  });

  // An exercise with quantity discounts, recomputed: toy cars at 5.00, 4.80 from 1,000, 4.75 from
  // 2,000; 25,700.00, 24,725.00 and 24,822.50 a year.
  it('is 1,000 with three prices', () => {
    const prices = ['5.00', '4.80', '4.75'];
    const breaks = [1, 1000, 2000].map((from, at) => ({ from, price: prices[at] }));
    const asked = { demand: 5000, orderCost: '49.00', holdingRate: 0.2 };
    const yearly = (these: typeof breaks) => compute('eoq', { ...asked, breaks: these });
    expect(yearly(breaks)).toEqual({ quantity: 1000, annualCost: '24725.00' });
    expect(yearly(breaks.slice(0, 1))).toEqual({ quantity: 700, annualCost: '25700.00' });
    expect(yearly(breaks.slice(2))).toEqual({ quantity: 2000, annualCost: '24822.50' });
  });

  // An exercise with five prices, recomputed; the yearly cost at each price by itself.
  it('is 200 with five prices', () => {
    const ladder = [
      [1, '53.00'],
      [50, '51.50'],
      [100, '49.50'],
      [200, '48.00'],
      [500, '47.00'],
    ].map(([from, price]) => ({ from, price }));
    const asked = { demand: 800, orderCost: '60.00', holdingRate: 0.3 };
    const yearly = (breaks: typeof ladder) => compute('eoq', { ...asked, breaks });
    expect(yearly(ladder)).toEqual({ quantity: 200, annualCost: '40080.00' });
    expect(yearly(ladder.slice(0, 2))).toEqual({
      quantity: expect.closeTo(78.82634225314345, 10),
      annualCost: '42417.87',
    });
    expect(yearly(ladder.slice(0, 3))).toEqual({ quantity: 100, annualCost: '40822.50' });
    expect(yearly(ladder.slice(4))).toEqual({ quantity: 500, annualCost: '41221.00' });
  });
});

describe('when to order', () => {
  // Taylor, Introduction to Management Science, chapter 16 (carpet, z 1.65); exercises (monitors;
  // steady demand, unsteady delivery); Heizer and Render (both vary, from memory). Recomputed.
  it.each([
    ['carpet', [30, 5, 10, 0], { z: 1.65 }, 26.088790696389133, 326.08879069638914],
    ['carpet, exact z', [30, 5, 10, 0], { service: 0.95 }, 26.00741939377787, 326.00741939377787],
    ['monitors', [2.5, 1.2, 25, 0], { service: 0.9 }, 7.689309393267601, 70.1893093932676],
    ['delivery varies', [5, 0, 3, 2], { service: 0.95 }, 16.448536269514722, 31.448536269514722],
    ['both vary', [150, 16, 5, 1], { z: 1.645 }, 253.6715878848082, 1003.6715878848082],
    ['demand varies', [15, 5, 2, 0], { z: 1.28 }, 9.05096679918781, 39.05096679918781],
  ])('%s', (_name, [demandMean, demandSd, leadMean, leadSd], service, safety, point) => {
    const over = { demandMean, demandSd, leadMean, leadSd };
    const answer = compute('reorder', { ...over, ...service });
    expect(answer).toEqual({
      safety: expect.closeTo(safety, 9),
      point: expect.closeTo(point, 9),
    });
  });

  // Recomputed with SciPy 1.17.1, and the same in R 4.2.2. Second opinion: jstat 1.9.6.
  it.each([
    [0.5, 0],
    [0.75, 0.6744897501960817],
    [0.8, 0.8416212335729143],
    [0.84, 0.994457883209753],
    [0.85, 1.0364333894937898],
    [0.9, 1.2815515655446004],
    [0.92, 1.4050715603096329],
    [0.95, 1.6448536269514722],
    [0.96, 1.7506860712521692],
    [0.97, 1.8807936081512509],
    [0.975, 1.959963984540054],
    [0.98, 2.0537489106318225],
    [0.99, 2.3263478740408408],
    [0.995, 2.5758293035489004],
    [0.999, 3.090232306167813],
    [0.9999, 3.719016485455709],
  ])('a service of %f has z = %f', (service, z) => {
    expect(normalQuantile(service)).toBeCloseTo(z, 12);
    expect(normalQuantile(service)).toBeCloseTo(jstat.normal.inv(service, 0, 1), 9);
  });
});

describe('use to come', () => {
  // Heizer and Render's tonnage (from memory), recomputed: each forecast, begun at 175.
  it.each([
    [0.1, [175.5, 174.75, 173.175, 173.3575, 175.02175, 178.019575, 178.2176175, 178.59585575]],
    [0.5, [177.5, 172.75, 165.875, 170.4375, 180.21875, 192.609375, 186.3046875, 184.15234375]],
  ])('smoothed by %f', (alpha, forecasts) => {
    const series = [180, 168, 159, 175, 190, 205, 180, 182];
    forecasts.forEach((forecast, at) => {
      const asked = { series: series.slice(0, at + 1), alpha, first: 175 };
      expect(compute('smooth', asked)).toEqual({ forecast: expect.closeTo(forecast, 10) });
    });
  });

  // Product C of Hyndman and Athanasopoulos, Forecasting: Principles and Practice; recomputed, and
  // by R's forecast 8.20, croston(): 0.9845965.
  it("by Croston's method", () => {
    const series = [
      0, 2, 0, 1, 0, 11, 0, 0, 0, 0, 2, 0, 6, 3, 0, 0, 0, 0, 0, 7, 0, 0, 0, 0, 0, 0, 0, 3, 1, 0, 0,
      1, 0, 1, 0, 0,
    ];
    expect(compute('croston', { series, alpha: 0.1 })).toEqual({
      size: expect.closeTo(2.7502538401, 10),
      interval: expect.closeTo(2.79328007, 10),
      forecast: expect.closeTo(0.9845965213577743, 12),
    });
  });
});

describe('what stock cost', () => {
  // OpenStax, Principles of Accounting 1, §10.3. The alt text of its figure prints 8,895 where the
  // text and the sum say 8,955: a misprint. Averages exact, in the book 7,253 and 8,902.
  const first = [
    { in: 150, unitCost: '21.00' },
    { out: 120 },
    { in: 225, unitCost: '27.00' },
    { out: 180 },
    { in: 210, unitCost: '33.00' },
  ];
  // The same section's second set of data, recomputed.
  const second = [
    { in: 240, unitCost: '100' },
    { out: 160 },
    { in: 520, unitCost: '103' },
    { out: 400 },
    { in: 400, unitCost: '110' },
    { out: 370 },
  ];

  it.each([
    ['fifo', first, '7200.00', '8955.00'],
    ['movingAverage', first, '7252.94', '8902.06'],
    ['fifo', second, '96260.00', '25300.00'],
    ['movingAverage', second, '96827.33', '24732.67'],
  ])('by %s', (method, movements, costOfGoods, value) => {
    expect(compute('stock-cost', { movements, method })).toEqual({ costOfGoods, value });
  });
});

describe('what can be promised', () => {
  // Stevenson, Operations Management, pumps (from memory), and an exercise with lots of 75; recomputed.
  it.each([
    [
      64,
      [0, 0, 70, 0, 70, 0, 70, 70],
      [33, 20, 10, 4, 2, 0, 0, 0],
      [11, null, 56, null, 68, null, 70, 70],
    ],
    [0, [75, 75, 75, 0], [52, 35, 20, 12], [23, 40, 43, null]],
  ])('with %i on hand, %j to come and %j ordered', (onHand, receipts, orders, available) => {
    expect(compute('available', { onHand, receipts, orders })).toEqual({ available });
  });
});
