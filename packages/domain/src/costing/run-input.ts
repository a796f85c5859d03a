import type { DecimalText } from '../numbers/decimal-text.ts';
import type { WorkPlan } from '../work/work-plan.ts';

/** How a price that nobody typed is worked out. Per cent as decimal text. */
export type PriceRule =
  /** the target per bench hour, before wages */
  | { kind: 'target' }
  /** what should remain of the price after all costs, tooling aside */
  | { kind: 'margin'; percent: DecimalText }
  /** what comes on top of all costs, tooling aside */
  | { kind: 'markup'; percent: DecimalText }
  /** a fixed sum for each piece on top of all costs, tooling aside */
  | { kind: 'fixed'; amount: DecimalText };

/** A price asked of the customer; null lets the price be worked out. */
export interface Break {
  quantity: number;
  typedPrice: DecimalText | null;
  /** in place of the run's own rule */
  rule?: PriceRule | null | undefined;
}

/** What a container (a panel, a strip, or one period of an endless strip) gives. */
export interface RunLayout {
  form: 'panel' | 'strip';
  pieces: number;
  containerAreaMm2: DecimalText;
  /** pieces in each row of it in cutting order, or in every row; left out where it has no rows */
  rowPieces?: number | readonly number[] | undefined;
}

export interface RunLeather {
  name: string;
  pricePerFt2: DecimalText;
  /** what runs take on top of the layout, for flaws and what is cut away around them, per cent */
  extraPercent?: DecimalText | undefined;
  /** what it is bought as, whole: a side of so much, of which so much can be used */
  whole?: { form: string; areaMm2: DecimalText; usablePercent: DecimalText } | null | undefined;
}

/** What hardware and supplies are counted for: thread and dye last for many pieces. */
export const hardwarePers = ['piece', 'hundred', 'run'] as const;
export type HardwarePer = (typeof hardwarePers)[number];

/** The same in words, to stand behind a count. */
export const perWords: Record<HardwarePer, string> = {
  piece: 'for each piece',
  hundred: 'for 100 pieces',
  run: 'for the run',
};

export interface RunHardware {
  /** the shop's own number of it, passed through */
  hardwareId?: number | undefined;
  name: string;
  /** up to 4 places */
  unitPrice: DecimalText;
  /** whole units for each piece, or for what `per` says */
  perPiece: number;
  /** what the units are counted for: each piece where nobody said */
  per?: HardwarePer | undefined;
  /** needed for every piece that reaches this step, counted from 0; else for the pieces ordered */
  fromStep?: number | null | undefined;
  /** of the hardware itself that is spoiled, per cent */
  lossPercent?: DecimalText | undefined;
}

/** Dye, thread, glue, boxes: what is used up. */
export interface RunSupply {
  name: string;
  unitPrice: DecimalText;
  per: HardwarePer;
  /** units used for each piece, for 100 pieces, or for the run */
  quantity: DecimalText;
}

export interface RunTooling {
  name: string;
  /** what the shop pays for it */
  cost: DecimalText;
  /** what the customer pays for it, once */
  charge: DecimalText;
}

/** An alternative that the customer may choose: the same run with other hardware. */
export interface RunOption {
  name: string;
  hardware: RunHardware[];
  /** on top of the price of the run as it is; null lets the difference be worked out */
  typedExtra: DecimalText | null;
}

/** Everything that the numbers of a run are worked out from. Money in major units as decimal text. */
export interface RunInput {
  breaks: Break[];
  /** how sure the cut count should be, per cent, below 100 */
  confidencePercent: DecimalText;
  layout: RunLayout;
  leather: RunLeather;
  hardware: RunHardware[];
  supplies?: RunSupply[] | undefined;
  tooling: RunTooling[];
  work: WorkPlan;
  /** pieces that came out good of those cut, in earlier runs */
  history?: { good: number; total: number } | null | undefined;
  /** allowance for rest on top of the bench minutes, per cent */
  restPercent?: DecimalText | undefined;
  wagePerHour: DecimalText;
  /** least that may be paid for an hour; piece rates and the wage are held against it */
  minimumWagePerHour?: DecimalText | null | undefined;
  /** a line of wages for each step in place of one for all */
  wagesByStep?: boolean | undefined;
  /** rent, light, insurance, for each bench hour */
  overheadPerHour?: DecimalText | undefined;
  deskMinutesPerOrder: DecimalText;
  packingPerOrder: DecimalText;
  packingPerPiece?: DecimalText | undefined;
  /** what the carrier asks, and what of it the customer pays */
  carriage?: { cost: DecimalText; charge: DecimalText } | undefined;
  /** what the card company keeps of the total, per cent, and of each payment */
  cardFee?: { percent: DecimalText; each: DecimalText } | undefined;
  /** what should be left per bench hour, before wages */
  targetPerHour: DecimalText;
  /** for quantities without a rule of their own; the target if left out */
  priceRule?: PriceRule | undefined;
  /** suggested prices are multiples of this */
  priceStep: DecimalText;
  /** no piece goes for less */
  floorPrice?: DecimalText | null | undefined;
  /** charged once for every order, tooling or not */
  setUpCharge?: DecimalText | undefined;
  /** of the goods, per cent, where it is wanted sooner than the shop would make it */
  rushPercent?: DecimalText | undefined;
  /** an order comes to at least so much, tooling and carriage aside */
  minimumOrder?: DecimalText | undefined;
  /** what the customer sells a piece for, where they sell it on */
  resalePrice?: DecimalText | null | undefined;
  options?: RunOption[] | undefined;
  /** decimals of the currency: 0 or 2 */
  minorDigits: number;
}
