import fc from 'fast-check';
import type { RunInput } from '../costing/run-input.ts';
import { Exact } from '../numbers/decimal-text.ts';

/** An amount in whole hundredths. */
const money = (min: number, max: number) =>
  fc
    .integer({ min: min * 100, max: max * 100 })
    .map((cents) => new Exact(cents).div(100).toFixed(2));

const aStep = fc.record({
  name: fc.constantFrom('Case', 'Strike', 'Cut', 'Rivet'),
  setupMinutes: fc.integer({ min: 0, max: 30 }).map(String),
  secondsPerUnit: fc.integer({ min: 1, max: 60 }).map(String),
  per: fc.constantFrom('piece' as const, 'strike' as const, 'panel' as const, 'run' as const),
  rejectPercent: fc.integer({ min: 0, max: 15 }).map(String),
  people: fc.integer({ min: 1, max: 3 }),
  pieceRate: fc.option(money(0, 1), { nil: null }),
});

/** A run with everything that can be said about one. */
export const aFullRun: fc.Arbitrary<RunInput> = fc.record({
  breaks: fc
    .uniqueArray(fc.integer({ min: 1, max: 1500 }), { minLength: 1, maxLength: 4 })
    .map((quantities) => quantities.map((quantity) => ({ quantity, typedPrice: null }))),
  confidencePercent: fc.constantFrom('80', '95'),
  layout: fc.record({
    form: fc.constantFrom('panel' as const, 'strip' as const),
    pieces: fc.integer({ min: 3, max: 80 }),
    containerAreaMm2: fc.integer({ min: 5_000, max: 900_000 }).map(String),
    rowPieces: fc.integer({ min: 1, max: 9 }),
  }),
  leather: fc.record({
    name: fc.constant('Side'),
    pricePerFt2: money(1, 40),
    extraPercent: fc.constantFrom('0', '4', '12.5'),
    whole: fc.constant({ form: 'side', areaMm2: '2043866.88', usablePercent: '85' }),
  }),
  hardware: fc.array(
    fc.record({
      name: fc.constant('Rivet'),
      unitPrice: money(1, 3),
      perPiece: fc.integer({ min: 1, max: 4 }),
      per: fc.constantFrom('piece' as const, 'hundred' as const, 'run' as const),
      fromStep: fc.constantFrom(null, 0, 1),
      lossPercent: fc.integer({ min: 0, max: 10 }).map(String),
    }),
    { maxLength: 2 },
  ),
  supplies: fc.array(
    fc.record({
      name: fc.constant('Edge dye'),
      unitPrice: money(1, 9),
      per: fc.constantFrom('piece' as const, 'hundred' as const, 'run' as const),
      quantity: fc.constantFrom('1', '0.25'),
    }),
    { maxLength: 2 },
  ),
  tooling: fc.array(
    money(0, 300).map((cost) => ({ name: 'Stamp plate', cost, charge: cost })),
    { maxLength: 2 },
  ),
  work: fc.record({
    kind: fc.constant('steps' as const),
    steps: fc.array(aStep, { minLength: 2, maxLength: 4 }),
    secondsPercent: fc.constantFrom('0', '3'),
  }),
  history: fc.option(fc.constant({ good: 940, total: 1000 }), { nil: null }),
  restPercent: fc.constantFrom('0', '8'),
  wagePerHour: money(5, 40),
  wagesByStep: fc.boolean(),
  overheadPerHour: money(0, 9),
  deskMinutesPerOrder: fc.integer({ min: 0, max: 120 }).map(String),
  packingPerOrder: money(0, 20),
  packingPerPiece: money(0, 1),
  carriage: fc.record({ cost: money(0, 20), charge: money(0, 20) }),
  cardFee: fc.record({ percent: fc.constantFrom('0', '2.9'), each: money(0, 1) }),
  targetPerHour: money(0, 120),
  priceRule: fc.constantFrom<NonNullable<RunInput['priceRule']>>(
    { kind: 'target' },
    { kind: 'margin', percent: '35' },
    { kind: 'markup', percent: '100' },
    { kind: 'fixed', amount: '1.25' },
  ),
  priceStep: fc.constantFrom('0.01', '0.05', '0.25'),
  floorPrice: fc.option(money(0, 5), { nil: null }),
  setUpCharge: money(0, 40),
  rushPercent: fc.constantFrom('0', '25'),
  minimumOrder: money(0, 200),
  resalePrice: fc.option(money(1, 20), { nil: null }),
  options: fc.array(
    fc.record({
      name: fc.constantFrom('Brass ring', 'Steel ring'),
      hardware: fc.constant([{ name: 'Ring', unitPrice: '1.60', perPiece: 1 }]),
      typedExtra: fc.option(money(0, 2), { nil: null }),
    }),
    { maxLength: 2 },
  ),
  minorDigits: fc.constant(2),
});
