import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sumOf } from '../costing/cost-lines.ts';
import type { RunInput } from '../costing/run-input.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { priceRun } from './price-run.ts';
import { quantityThatReaches } from './quantity-that-reaches.ts';
import { aFullRun } from './run.arbitrary.ts';
import type { BreakNumbers } from './run-numbers.ts';
import { shakeRun } from './sensitivity.ts';

/** A piece costs 2.00 of leather and 1.50 of wages; 100 pieces take 5 hours at the bench. */
const run: RunInput = {
  breaks: [{ quantity: 100, typedPrice: null }],
  confidencePercent: '95',
  layout: { form: 'panel', pieces: 10, containerAreaMm2: '92903.04', rowPieces: 4 },
  leather: { name: 'Oak tan', pricePerFt2: '20.00' },
  hardware: [],
  tooling: [],
  work: { kind: 'minutesPer100', minutes: '300', rejectPercent: '0' },
  wagePerHour: '30.00',
  deskMinutesPerOrder: '0',
  packingPerOrder: '0.00',
  targetPerHour: '60.00',
  priceStep: '0.01',
  minorDigits: 2,
};
const first = (input: RunInput) => priceRun(input).breaks[0] as BreakNumbers;
const priceBy = (rule: RunInput['priceRule'], more: Partial<RunInput> = {}) =>
  first({ ...run, ...more, priceRule: rule }).suggestedPrice;

describe('how a price is worked out that nobody typed', () => {
  it('keeps a margin of the price, a markup on the cost, or a fixed sum on top', () => {
    expect(first(run).unitCost).toBe('3.5000');
    expect(priceBy({ kind: 'target' })).toBe('5');
    // 3.50 ÷ 0.65 = 5.3846
    expect(priceBy({ kind: 'margin', percent: '35' })).toBe('5.39');
    expect(priceBy({ kind: 'markup', percent: '100' })).toBe('7');
    expect(priceBy({ kind: 'fixed', amount: '1.25' })).toBe('4.75');
  });

  it('follows a quantity’s own rule before the run’s', () => {
    const breaks: RunInput['breaks'] = [
      { quantity: 50, typedPrice: null, rule: { kind: 'markup', percent: '100' } },
      { quantity: 100, typedPrice: null },
    ];
    expect(priceRun({ ...run, breaks }).breaks.map((rung) => rung.suggestedPrice)).toEqual([
      '7',
      '5',
    ]);
  });

  it('earns its card fees too', () => {
    const dear = first({ ...run, cardFee: { percent: '2', each: '0' } });
    // (2.00 + 3.00) ÷ 0.98
    expect(dear.suggestedPrice).toBe('5.11');
    expect(dear.costLines.find(({ kind }) => kind === 'fees')?.amount).toBe('10.22');
    expect(dear.reachesTarget).toBe(true);
  });

  it('never goes below the floor, and says so where a typed price does', () => {
    expect(priceBy({ kind: 'target' }, { floorPrice: '6.004' })).toBe('6.01');
    const typed = first({
      ...run,
      floorPrice: '6',
      breaks: [{ quantity: 100, typedPrice: '5.50' }],
    });
    expect(typed.warnings).toContainEqual(expect.stringContaining('below your floor of 6.00'));
  });

  it('keeps its rule on any run, whatever else is charged or costs', { timeout: 60_000 }, () => {
    fc.assert(
      fc.property(aFullRun, (input) => {
        const plain = { ...input, tooling: [], rushPercent: '0', minimumOrder: '0' };
        for (const rung of priceRun(plain).breaks) {
          const costs = sumOf(rung.costLines, () => true);
          const total = new Exact(rung.total);
          const rule = input.priceRule ?? { kind: 'target' };
          if (rule.kind === 'target') expect(rung.reachesTarget).toBe(true);
          if (rule.kind === 'margin') expect(total.times('0.65').gte(costs)).toBe(true);
          if (rule.kind === 'markup') expect(total.gte(costs.times(2))).toBe(true);
          if (rule.kind === 'fixed')
            expect(total.minus(costs).gte(new Exact('1.25').times(rung.quantity))).toBe(true);
        }
      }),
      { numRuns: 60, seed: 4 },
    );
  });
});

describe('what is charged beside the pieces', () => {
  const charged = (more: Partial<RunInput>) =>
    first({ ...run, breaks: [{ quantity: 10, typedPrice: '5.00' }], ...more });

  it('adds setting up, rush on the goods, and carriage', () => {
    const rung = charged({
      setUpCharge: '15.00',
      rushPercent: '25',
      carriage: { cost: '7.10', charge: '8.00' },
    });
    expect(rung.charges).toEqual([
      { kind: 'set-up', name: 'Setting up', amount: '15.00' },
      { kind: 'rush', name: 'Rush', amount: '12.50' },
      { kind: 'carriage', name: 'Carriage', amount: '8.00' },
    ]);
    expect(rung.total).toBe('85.50');
  });

  it('brings a small order up to the minimum, tooling and carriage aside', () => {
    const tooling = [{ name: 'Stamp plate', cost: '48.00', charge: '60.00' }];
    const rung = charged({ tooling, minimumOrder: '75.00', setUpCharge: '10.00' });
    expect(rung.charges.at(-1)).toMatchObject({ kind: 'minimum', amount: '15.00' });
    expect(rung.total).toBe('135.00');
    expect(rung.reorderTotal).toBe('75.00');
    expect(charged({ minimumOrder: '50.00' }).charges).toEqual([]);
  });

  it('adds up to the cent on any run', { timeout: 60_000 }, () => {
    fc.assert(
      fc.property(aFullRun, (input) => {
        const { breaks, options } = priceRun(input);
        for (const rung of [...breaks, ...options.flatMap((option) => option.breaks)]) {
          const sum = rung.charges.reduce(
            (total, { amount }) => total.plus(amount),
            new Exact(rung.goodsTotal).plus(rung.toolingCharge),
          );
          expect(sum.toFixed(2)).toBe(rung.total);
          expect(new Exact(rung.goodsTotal).toFixed(2)).toBe(
            new Exact(rung.priceEach).times(rung.quantity).toFixed(2),
          );
        }
      }),
      { numRuns: 40, seed: 4 },
    );
  });
});

describe('options', () => {
  const options = [
    { name: 'Brass ring', hardware: [ring('1.60')], typedExtra: null },
    { name: 'Dear ring', hardware: [ring('1.60')], typedExtra: '2.00' },
  ];

  function ring(unitPrice: string) {
    return { name: 'Ring', unitPrice, perPiece: 1 };
  }

  it('cost their difference more, or what was typed', () => {
    const numbers = priceRun({ ...run, hardware: [ring('1.00')], options });
    expect(numbers.breaks[0]?.priceEach).toBe('6');
    expect(numbers.options.map(({ breaks }) => breaks[0]?.priceEach)).toEqual(['6.6', '8']);
    expect(numbers.options[0]?.breaks[0]?.reachesTarget).toBe(true);
  });

  it('keep their difference where the owner typed the price', () => {
    const breaks = [{ quantity: 100, typedPrice: '5.00' }];
    const numbers = priceRun({ ...run, breaks, hardware: [ring('1.00')], options });
    expect(numbers.options.map((option) => option.breaks[0]?.priceEach)).toEqual(['5.6', '7']);
    expect(numbers.warnings).toContain('With Brass ring the target is missed at 100.');
  });

  it('are refused where a piece would cost nothing', () => {
    const free = [{ name: 'No ring', hardware: [], typedExtra: '-5' }];
    expect(() => priceRun({ ...run, options: free })).toThrow('No ring would cost nothing at 100');
  });
});

describe('what reaches the target', () => {
  const withSetup: RunInput = {
    ...run,
    tooling: [{ name: 'Stamp plate', cost: '60.00', charge: '0.00' }],
  };

  it('is the fewest pieces with which the price does', () => {
    // 5.50 leaves 0.50 a piece beyond the target: 120 pay for the plate
    expect(quantityThatReaches(withSetup, '5.50')).toBe(120);
    const at = (quantity: number) =>
      first({ ...withSetup, breaks: [{ quantity, typedPrice: '5.50' }] }).reachesTarget;
    expect([at(119), at(120)]).toEqual([false, true]);
  });

  it('is no quantity where each piece misses it', () => {
    expect(quantityThatReaches(withSetup, '4.90')).toBeNull();
  });
});

describe('if it turns out otherwise', () => {
  it('earns less with more of anything, at the same price', () => {
    const rejects = { ...run.work, rejectPercent: '10' } as RunInput['work'];
    const input = { ...run, work: rejects };
    const shakes = shakeRun(input, first(input), 20);
    expect(shakes.map(({ what }) => what)).toEqual(['rejects', 'minutes', 'leather price']);
    for (const { less, more } of shakes) {
      expect(Number(less.perBenchHour)).toBeGreaterThan(Number(more.perBenchHour));
      expect(Number(less.perHourAllIn)).toBeGreaterThan(Number(more.perHourAllIn));
    }
  });

  it('moves as far as the leather price says', () => {
    // 2.00 of leather for each of 20 pieces an hour, a fifth less: 8.00 more
    const [, , leather] = shakeRun(run, first(run), 20);
    expect(leather).toMatchObject({
      less: { perBenchHour: '68.00' },
      more: { perBenchHour: '52.00' },
    });
  });
});

describe('warnings', () => {
  it('name what has no price, and price the rest', () => {
    const numbers = priceRun({
      ...run,
      hardware: [{ name: 'Rivet', unitPrice: '0', perPiece: 2 }],
    });
    expect(numbers.warnings).toContain(
      'Rivet has no price yet and is counted as nothing: enter one.',
    );
    expect(numbers.breaks[0]?.priceEach).toBe('5');
  });

  it('hold a piece rate and the wage against the minimum', () => {
    const step = {
      name: 'Set rivets',
      setupMinutes: '0',
      secondsPerUnit: '36',
      per: 'piece' as const,
      rejectPercent: '0',
      pieceRate: '0.10',
    };
    const numbers = priceRun({
      ...run,
      work: { kind: 'steps', steps: [step] },
      wagesByStep: true,
      minimumWagePerHour: '31.00',
    });
    expect(numbers.breaks[0]?.costLines.find(({ kind }) => kind === 'wages')).toMatchObject({
      name: 'Set rivets',
      amount: '10.00',
    });
    expect(numbers.warnings.join(' ')).toContain('Set rivets at 0.10 comes to 10.00 an hour');
    expect(numbers.warnings.join(' ')).toContain('The wage of 30.00 an hour is below the minimum');
  });
});
