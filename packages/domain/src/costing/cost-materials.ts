import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, toAtMost, toPlaces, upToWhole } from '../numbers/decimal-text.ts';
import { mm2ToFootage } from '../units/footage.ts';
import type { CostLines } from './cost-lines.ts';
import { perWords, type RunHardware, type RunInput, type RunSupply } from './run-input.ts';

/** Leather as it must be bought: whole sides, hides or panels. */
export interface BoughtWhole {
  count: number;
  /** side, hide, panel… */
  form: string;
  areaMm2: DecimalText;
  amount: DecimalText;
}

interface Taken {
  quantity: number;
  containers: number;
  area: Decimal;
  counts: readonly number[];
}

/** Adds leather, hardware and supplies. */
export function addMaterials(lines: CostLines, input: RunInput, taken: Taken): void {
  addLeather(lines, input, taken);
  input.hardware.forEach((hardware, at) => {
    const count = taken.counts[at] ?? 0;
    const workings = hardwareWorkings(hardware, taken.quantity, count);
    lines.add('hardware', hardware.name, new Exact(hardware.unitPrice).times(count), workings);
  });
  for (const supply of input.supplies ?? []) addSupply(lines, supply, taken.quantity);
}

/** What must be bought whole for so much leather; null where a whole one is not known. */
export function boughtWhole({ leather, minorDigits }: RunInput, area: Decimal): BoughtWhole | null {
  if (!leather.whole) return null;
  const { form, areaMm2, usablePercent } = leather.whole;
  const usable = new Exact(areaMm2).times(usablePercent).div(100);
  const count = upToWhole(area.div(usable)).toNumber();
  const bought = new Exact(areaMm2).times(count);
  const amount = mm2ToFootage(bought).times(leather.pricePerFt2);
  return { count, form, areaMm2: toAtMost(bought, 3), amount: toPlaces(amount, minorDigits) };
}

function addLeather(lines: CostLines, input: RunInput, { containers, area }: Taken): void {
  const { leather, layout } = input;
  const footage = mm2ToFootage(area);
  const one = toAtMost(mm2ToFootage(layout.containerAreaMm2), 3);
  const more = Number(leather.extraPercent ?? '0') > 0 ? ` and ${leather.extraPercent} % more` : '';
  const noun = `${layout.form}${containers === 1 ? '' : 's'}`;
  lines.add(
    'leather',
    leather.name,
    footage.times(leather.pricePerFt2),
    `${containers} ${noun} × ${one} ft²${more} at ${leather.pricePerFt2} per ft²`,
  );
}

function hardwareWorkings(hardware: RunHardware, quantity: number, count: number): string {
  const { perPiece, per = 'piece', unitPrice } = hardware;
  if (per !== 'piece') return `${count} at ${unitPrice}: ${perPiece} ${perWords[per]}`;
  return count === perPiece * quantity
    ? `${perPiece} per piece × ${quantity} at ${unitPrice}`
    : `${count} at ${unitPrice}: ${perPiece} for every piece that comes so far, and for losses`;
}

function addSupply(lines: CostLines, supply: RunSupply, quantity: number): void {
  const { name, unitPrice, per, quantity: used } = supply;
  const times = per === 'run' ? new Exact(1) : new Exact(quantity).div(per === 'piece' ? 1 : 100);
  const amount = times.times(used).times(unitPrice);
  lines.add('supplies', name, amount, `${used} ${perWords[per]} at ${unitPrice}`);
}
