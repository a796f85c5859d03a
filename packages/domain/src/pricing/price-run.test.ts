import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { RunInput } from '../costing/run-input.ts';
import { Exact } from '../numbers/decimal-text.ts';
import type { BreakNumbers } from './run-numbers.ts';
import { priceRun } from './price-run.ts';
import { aFullRun } from './run.arbitrary.ts';

/** 20 pieces per ft² of leather at 10.00, a rivet at 0.17 and a ring at 1.00, 150 minutes per 100. */
const run: RunInput = {
  breaks: [{ quantity: 20, typedPrice: '4.00' }],
  confidencePercent: '95',
  layout: { form: 'panel', pieces: 20, containerAreaMm2: '92903.04' },
  leather: { name: 'Russet side', pricePerFt2: '10.00' },
  hardware: [
    { name: 'Rivet', unitPrice: '0.17', perPiece: 1 },
    { name: 'Ring', unitPrice: '1.00', perPiece: 1 },
  ],
  tooling: [],
  work: { kind: 'minutesPer100', minutes: '150', rejectPercent: '0' },
  wagePerHour: '18.00',
  deskMinutesPerOrder: '30',
  packingPerOrder: '0.00',
  targetPerHour: '60.00',
  priceStep: '0.05',
  minorDigits: 2,
};

const money = (min: number, max: number) =>
  fc
    .integer({ min: min * 100, max: max * 100 })
    .map((cents) => new Exact(cents).div(100).toFixed(2));

const aRun: fc.Arbitrary<RunInput> = fc.record({
  breaks: fc
    .uniqueArray(fc.integer({ min: 1, max: 2000 }), { minLength: 1, maxLength: 5 })
    .map((quantities) => quantities.map((quantity) => ({ quantity, typedPrice: null }))),
  confidencePercent: fc.constantFrom('80', '95', '99'),
  layout: fc.record({
    form: fc.constantFrom('panel' as const, 'strip' as const),
    pieces: fc.integer({ min: 1, max: 150 }),
    containerAreaMm2: fc.integer({ min: 5_000, max: 3_000_000 }).map(String),
  }),
  leather: fc.record({ name: fc.constant('Side'), pricePerFt2: money(1, 40) }),
  hardware: fc.array(
    fc.record({
      name: fc.constant('Rivet'),
      unitPrice: money(0, 3),
      perPiece: fc.integer({ min: 1, max: 4 }),
    }),
    { maxLength: 3 },
  ),
  tooling: fc.array(
    money(0, 300).map((cost) => ({ name: 'Cutting die', cost, charge: cost })),
    { maxLength: 2 },
  ),
  work: fc.record({
    kind: fc.constant('minutesPer100' as const),
    minutes: fc.integer({ min: 5, max: 3000 }).map(String),
    rejectPercent: fc.integer({ min: 0, max: 40 }).map(String),
  }),
  wagePerHour: money(0, 50),
  deskMinutesPerOrder: fc.integer({ min: 0, max: 300 }).map(String),
  packingPerOrder: money(0, 40),
  targetPerHour: money(0, 150),
  priceStep: fc.constantFrom('0.01', '0.05', '0.25', '1'),
  minorDigits: fc.constant(2),
});

const first = (input: RunInput): BreakNumbers => priceRun(input).breaks[0] as BreakNumbers;
const each = (numbers: BreakNumbers, name: string) =>
  numbers.costLines.find((line) => line.name === name)?.each;

describe('the numbers of a run', { timeout: 60_000 }, () => {
  // Common practice, no source: these three are how a shop reckons on paper.
  it('costs 0.50 of leather where 10.00 per ft² gives 20 pieces', () => {
    expect(each(first(run), 'Russet side')).toBe('0.5000');
  });

  it('costs 1.67 of materials with a rivet and a ring', () => {
    const materials = first(run).costLines.filter(
      ({ kind }) => kind === 'leather' || kind === 'hardware',
    );
    const sum = materials.reduce((total, line) => total.plus(line.each), new Exact(0));
    expect(sum.toFixed(2)).toBe('1.67');
  });

  it('leaves 93.20 per bench hour where 20 pieces at 4.00 take 30 minutes', () => {
    expect(first(run)).toMatchObject({
      goodsTotal: '80.00',
      left: '46.60',
      benchMinutes: '30',
      perBenchHour: '93.20',
      // 46.60 less 9.00 of wages and 9.00 of desk time, by one hour
      allMinutes: '60',
      perHourAllIn: '28.60',
      reachesTarget: true,
      loses: false,
      typed: true,
    });
  });

  it('suggests the smallest step that reaches the target', () => {
    fc.assert(
      fc.property(aRun, (input) => {
        const quantity = { ...input, breaks: input.breaks.slice(0, 1) };
        const numbers = first(quantity);
        const below = new Exact(numbers.suggestedPrice).minus(input.priceStep);
        expect(numbers.reachesTarget).toBe(true);
        if (below.lte(0)) return;
        const [asked] = quantity.breaks;
        const cheaper = first({
          ...quantity,
          breaks: [{ quantity: asked?.quantity ?? 1, typedPrice: below.toFixed() }],
        });
        expect(cheaper.reachesTarget).toBe(false);
      }),
    );
  });

  it('makes a ladder that never rises, on which every rung reaches the target', () => {
    fc.assert(
      fc.property(aRun, (input) => {
        const { breaks } = priceRun(input);
        breaks.forEach((rung, at) => {
          const next = breaks[at + 1];
          expect(rung.reachesTarget).toBe(true);
          if (next) expect(new Exact(next.priceEach).lte(rung.priceEach)).toBe(true);
          if (next) expect(next.quantity).toBeGreaterThan(rung.quantity);
        });
      }),
    );
  });

  it('never costs less with more rejects', () => {
    fc.assert(
      fc.property(aRun, fc.integer({ min: 1, max: 30 }), (input, more) => {
        if (input.work.kind !== 'minutesPer100') return;
        const rejectPercent = String(Number(input.work.rejectPercent) + more);
        const worse = priceRun({ ...input, work: { ...input.work, rejectPercent } }).breaks;
        priceRun(input).breaks.forEach((rung, at) => {
          expect(new Exact(worse[at]?.unitCost ?? 0).gte(rung.unitCost)).toBe(true);
          expect(worse[at]?.cutCount).toBeGreaterThanOrEqual(rung.cutCount);
        });
      }),
    );
  });

  // A piece that is spoiled earlier costs the later steps nothing, so between two cut counts a few more early rejects
  // may save them some seconds; at the last step nothing comes after.
  it('never costs less with more rejects at the last step', () => {
    fc.assert(
      fc.property(aFullRun, fc.integer({ min: 1, max: 30 }), (full, more) => {
        if (full.work.kind !== 'steps') return;
        const last = full.work.steps.length - 1;
        const steps = full.work.steps.map((step, at) => ({
          ...step,
          rejectPercent: String(Number(step.rejectPercent) + (at === last ? more : 0)),
        }));
        const input = { ...full, history: null };
        const worse = priceRun({ ...input, work: { ...full.work, steps } }).breaks;
        priceRun(input).breaks.forEach((rung, at) => {
          expect(new Exact(worse[at]?.unitCost ?? 0).gte(rung.unitCost)).toBe(true);
          expect(worse[at]?.cutCount).toBeGreaterThanOrEqual(rung.cutCount);
        });
      }),
    );
  });

  it('adds up: price times quantity, tooling on top, left and costs', () => {
    fc.assert(
      fc.property(aRun, (input) => {
        for (const rung of priceRun(input).breaks) {
          const sum = (kinds: string[]) =>
            rung.costLines
              .filter(({ kind }) => kinds.includes(kind))
              .reduce((total, { amount }) => total.plus(amount), new Exact(0));
          expect(new Exact(rung.goodsTotal).plus(rung.toolingCharge).eq(rung.total)).toBe(true);
          const bought = sum(['leather', 'hardware', 'tooling', 'packing']);
          expect(new Exact(rung.total).minus(bought).eq(rung.left)).toBe(true);
          expect(rung.cutPieces - rung.overs).toBe(rung.cutCount);
        }
      }),
    );
  });

  it('keeps tooling out of the unit cost and the suggested price', () => {
    const breaks = [{ quantity: 20, typedPrice: null }];
    const plain = first({ ...run, breaks });
    const tooled = first({
      ...run,
      breaks,
      tooling: [{ name: 'Plate', cost: '85.00', charge: '85.00' }],
    });
    expect(tooled.unitCost).toBe(plain.unitCost);
    expect(tooled.suggestedPrice).toBe(plain.suggestedPrice);
    expect(tooled.perBenchHour).toBe(plain.perBenchHour);
    expect(new Exact(tooled.total).minus(plain.total).toFixed(2)).toBe('85.00');
  });

  it('gives the same for the same, in whatever order the quantities were typed', () => {
    fc.assert(
      fc.property(aRun, (input) => {
        const backwards = { ...input, breaks: [...input.breaks].reverse() };
        expect(priceRun(backwards)).toEqual(priceRun({ ...input }));
      }),
      { numRuns: 20 },
    );
  });
});

describe('warnings', () => {
  const typed = (quantity: number, typedPrice: string) => ({ quantity, typedPrice });

  it('says that a rung loses money, misses the target, and which price reaches it', () => {
    const numbers = first({ ...run, breaks: [typed(20, '2.00')] });
    expect(numbers).toMatchObject({
      loses: true,
      reachesTarget: false,
      priceThatReachesTarget: '3.2',
    });
    expect(numbers.warnings).toEqual([
      'At 20 this run loses 11.40: it costs more than it brings, wages included.',
      'At 20 it leaves 13.20 per bench hour, below your 60.00: 3.20 each would reach it.',
    ]);
  });

  it('says nothing about a run that pays', () => {
    expect(priceRun(run)).toMatchObject({ warnings: [], breaks: [{ warnings: [] }] });
  });

  it('names the quantity from which ordering more costs less in total', () => {
    const { breaks } = priceRun({ ...run, breaks: [typed(100, '5.00'), typed(250, '4.00')] });
    // 200 at 5.00 cost as much as 250 at 4.00
    expect(breaks.map(({ cheaperFrom }) => cheaperFrom)).toEqual([201, null]);
    expect(breaks[0]?.warnings).toEqual([]);
  });

  it('looks beyond the next quantity for one that costs less', () => {
    const breaks = [typed(10, '10.00'), typed(50, '9.00'), typed(100, '4.00')];
    const rungs = priceRun({ ...run, breaks }).breaks;
    // 40 at 10.00 cost as much as 100 at 4.00; and 50 at 9.00 cost more.
    expect(rungs.map(({ cheaperFrom }) => cheaperFrom)).toEqual([41, 50, null]);
    expect(rungs.map(({ cheaperQuantity }) => cheaperQuantity)).toEqual([100, 100, null]);
    const dear = [typed(10, '10.00'), typed(50, '10.00'), typed(100, '0.90')];
    expect(priceRun({ ...run, breaks: dear }).breaks[0]?.warnings.at(-1)).toMatch(
      /^Ordering 100 costs less in total than 10:/,
    );
  });

  it('warns where an option has no price yet, or rises with the quantity', () => {
    const ring = { name: 'Brass ring', unitPrice: '0', perPiece: 1 };
    const option = { name: 'the brass ring', hardware: [ring], typedExtra: null };
    const { warnings } = priceRun({ ...run, options: [option] });
    expect(warnings).toContain('Brass ring has no price yet and is counted as nothing: enter one.');
    const breaks = [typed(20, '4.00'), typed(500, '4.00')];
    const dearer = { ...option, hardware: [{ ...ring, unitPrice: '1.50' }] };
    const tooling = [{ name: 'Plate', cost: '0', charge: '0' }];
    const options = priceRun({ ...run, breaks, tooling, options: [dearer] }).options[0]?.breaks;
    const rises = new Exact(options?.[1]?.priceEach ?? 0).gt(options?.[0]?.priceEach ?? 0);
    const said = priceRun({ ...run, breaks, tooling, options: [dearer] }).warnings;
    expect(said.some((each) => each.startsWith('With the brass ring the price rises'))).toBe(rises);
  });

  it('does not let a minimum order pass for a price that reaches the target', () => {
    const small = { ...run, breaks: [typed(10, '0.05')], minimumOrder: '75.00' };
    const { priceThatReachesTarget } = first(small);
    expect(priceThatReachesTarget).toBe(
      first({ ...small, minimumOrder: '0' }).priceThatReachesTarget,
    );
    expect(new Exact(priceThatReachesTarget).gt('1')).toBe(true);
  });

  it('warns where the smaller quantity itself already costs more', () => {
    const { breaks } = priceRun({ ...run, breaks: [typed(100, '9.00'), typed(200, '4.00')] });
    expect(breaks[0]?.warnings).toEqual([
      'Ordering 200 costs less in total than 100: raise its price or lower this one.',
    ]);
  });

  it('warns where the price rises, and where tooling is not paid for', () => {
    const breaks = [typed(100, '4.00'), typed(200, '5.00')];
    const tooling = [{ name: 'Plate', cost: '85.00', charge: '40.00' }];
    expect(priceRun({ ...run, breaks, tooling }).warnings).toEqual([
      'The price rises from 4.00 at 100 to 5.00 at 200: a larger order should not cost more each.',
      'The tooling costs 45.00 more than is charged for it: charge it, or the run pays for it.',
    ]);
  });
});

describe('bad input', () => {
  it.each([
    ['breaks', { breaks: [] }],
    ['breaks.1.quantity', { breaks: [...run.breaks, ...run.breaks] }],
    ['breaks.0.quantity', { breaks: [{ quantity: 0, typedPrice: null }] }],
    ['breaks.0.typedPrice', { breaks: [{ quantity: 5, typedPrice: '-1' }] }],
    ['confidencePercent', { confidencePercent: '100' }],
    ['layout.pieces', { layout: { ...run.layout, pieces: 0 } }],
    ['priceStep', { priceStep: '0' }],
    ['wagePerHour', { wagePerHour: 'NaN' }],
    ['tooling.0.cost', { tooling: [{ name: 'Die', cost: '1.005', charge: '1' }] }],
  ] satisfies [string, Partial<RunInput>][])('is refused, naming %s', (field, change) => {
    expect(() => priceRun({ ...run, ...change })).toThrow(expect.objectContaining({ field }));
  });

  it('asks for bench time where there is none', () => {
    const work = { kind: 'minutesPer100' as const, minutes: '0', rejectPercent: '0' };
    expect(() => priceRun({ ...run, work })).toThrow('Say how many minutes 100 pieces take');
    const idle = { setupMinutes: '0', secondsPerUnit: '60', unattended: true };
    const steps = [{ ...idle, name: 'Press', per: 'piece' as const, rejectPercent: '0' }];
    expect(() => priceRun({ ...run, work: { kind: 'steps', steps } })).toThrow(
      'Give a step of the pattern its setup or its seconds a piece, with somebody at it',
    );
  });
});
