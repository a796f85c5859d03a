import type { Decimal } from 'decimal.js';
import { Exact, upToWhole } from '../numbers/decimal-text.ts';
import { sharesReaching } from '../work/bench-minutes.ts';
import type { RunHardware, RunInput } from './run-input.ts';

/**
 * Units of each line of hardware: for the pieces ordered, or for those that reach the step from which it is needed, on
 * average and rounded up; and so many more as are lost themselves. What is counted for the run is needed once.
 */
export function hardwareCounts(input: RunInput, quantity: number, cut: number): number[] {
  const shares = sharesReaching(input.work);
  return input.hardware.map((line) => {
    const { fromStep, lossPercent } = line;
    const reaching =
      fromStep === null || fromStep === undefined
        ? new Exact(quantity)
        : Exact.max(quantity, upToWhole(new Exact(cut).times(shares[fromStep] ?? 1)));
    const sound = new Exact(100).minus(lossPercent ?? '0').div(100);
    return upToWhole(unitsFor(line, reaching).div(sound)).toNumber();
  });
}

/** Units of each line for the pieces ordered alone, as if none were lost: what is counted beyond them is for losses. */
export function hardwareOrdered({ hardware }: RunInput, quantity: number): number[] {
  return hardware.map((line) => upToWhole(unitsFor(line, quantity)).toNumber());
}

/** Whether nothing can be counted for losses, since nobody said which pieces need it nor how much of it is spoiled. */
export function lossesUnsaid({ per = 'piece', fromStep, lossPercent }: RunHardware): boolean {
  return per === 'piece' && typeof fromStep !== 'number' && new Exact(lossPercent ?? '0').isZero();
}

/** Units that so many pieces need before any is lost, with its fraction: 250 pieces at 2 for 100 need 5. */
export function unitsFor(
  { perPiece, per = 'piece' }: Pick<RunHardware, 'perPiece' | 'per'>,
  pieces: Decimal | number,
): Decimal {
  if (per === 'run') return new Exact(perPiece);
  return new Exact(pieces).times(perPiece).div(per === 'hundred' ? 100 : 1);
}
