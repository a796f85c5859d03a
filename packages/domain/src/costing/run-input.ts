import type { DecimalText } from '../numbers/decimal-text.ts';
import type { WorkPlan } from '../work/work-plan.ts';

/** A price asked of the customer; null lets the price be worked out. */
export interface Break {
  quantity: number;
  typedPrice: DecimalText | null;
}

/** What a container (a panel, a strip, or one period of an endless strip) gives. */
export interface RunLayout {
  form: 'panel' | 'strip';
  pieces: number;
  containerAreaMm2: DecimalText;
}

export interface RunHardware {
  name: string;
  /** up to 4 places */
  unitPrice: DecimalText;
  perPiece: number;
}

export interface RunTooling {
  name: string;
  /** what the shop pays for it */
  cost: DecimalText;
  /** what the customer pays for it, once */
  charge: DecimalText;
}

/** Everything that the numbers of a run are worked out from. Money in major units as decimal text. */
export interface RunInput {
  breaks: Break[];
  /** how sure the cut count should be, per cent, below 100 */
  confidencePercent: DecimalText;
  layout: RunLayout;
  leather: { name: string; pricePerFt2: DecimalText };
  hardware: RunHardware[];
  tooling: RunTooling[];
  work: WorkPlan;
  wagePerHour: DecimalText;
  deskMinutesPerOrder: DecimalText;
  packingPerOrder: DecimalText;
  /** what should be left per bench hour, before wages */
  targetPerHour: DecimalText;
  /** suggested prices are multiples of this */
  priceStep: DecimalText;
  /** decimals of the currency: 0 or 2 */
  minorDigits: number;
}
