import { InvalidInput } from '../errors/domain-error.ts';
import { readWhole } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';

export interface WaysInput {
  /** pieces, 1 to 100,000 */
  pieces: number;
  /** seconds per piece and minutes of setting up at each step, in the order of work; 0 or more */
  steps: readonly { secondsPerPiece: number; setupMinutes: number }[];
  /** extra seconds to put a batch down, carry it and take it up again, at every step but the first */
  handlingSeconds: number;
  /** pieces handed on together, one way for each; the whole quantity or more is one batch */
  batches: readonly number[];
  /** `one`: one pair of hands does all steps; `each`: somebody stands at every step */
  hands: 'one' | 'each';
}

export interface WayOfWorking {
  batch: number;
  /** handling of the whole run, in seconds */
  handlingSeconds: number;
  /** from the first piece begun to the last one finished, in minutes, all setting up included */
  elapsedMinutes: number;
  /** until the first batch is finished, in minutes */
  firstReadyMinutes: number;
}

/**
 * One piece at a time, step by step, or in batches between: what each way costs in handling, how
 * long the run takes and when its first pieces are ready. Each step is set up once. With one pair of
 * hands a batch goes through all steps before the next is begun; with somebody at each step a batch
 * moves on when all of it is done, and steps are set up before they are needed.
 * @throws InvalidInput
 */
export function waysOfWorking(input: WaysInput): WayOfWorking[] {
  readWhole(input.pieces, 'pieces', 1, 100_000);
  readNumber(input.handlingSeconds, 'handlingSeconds', { min: 0 });
  if (input.steps.length === 0) throw new InvalidInput('steps', 'Give at least one step.');
  input.steps.forEach((step, at) => {
    readNumber(step.secondsPerPiece, `steps.${at}.secondsPerPiece`, { min: 0 });
    readNumber(step.setupMinutes, `steps.${at}.setupMinutes`, { min: 0 });
  });
  return input.batches.map((batch, at) => {
    readWhole(batch, `batches.${at}`, 1, 1_000_000);
    return wayOf(input, Math.min(batch, input.pieces));
  });
}

function wayOf(input: WaysInput, batch: number): WayOfWorking {
  const { pieces, steps, handlingSeconds } = input;
  const count = Math.ceil(pieces / batch);
  const sizes = Array.from({ length: count }, (_, at) => Math.min(batch, pieces - at * batch));
  const ends = input.hands === 'one' ? endsByOne(input, sizes) : endsByEach(input, sizes);
  return {
    batch,
    handlingSeconds: count * (steps.length - 1) * handlingSeconds,
    elapsedMinutes: (ends.at(-1) ?? 0) / 60,
    firstReadyMinutes: (ends[0] ?? 0) / 60,
  };
}

/** When each batch is finished, in seconds. */
function endsByOne({ steps, handlingSeconds }: WaysInput, sizes: readonly number[]): number[] {
  let now = 60 * steps.reduce((sum, step) => sum + step.setupMinutes, 0);
  const seconds = steps.reduce((sum, step) => sum + step.secondsPerPiece, 0);
  return sizes.map((size) => {
    now += size * seconds + (steps.length - 1) * handlingSeconds;
    return now;
  });
}

function endsByEach({ steps, handlingSeconds }: WaysInput, sizes: readonly number[]): number[] {
  const free = steps.map((step) => 60 * step.setupMinutes);
  return sizes.map((size) =>
    steps.reduce((ready, { secondsPerPiece }, at) => {
      const begins = Math.max(ready, free[at] ?? 0);
      const ends = begins + size * secondsPerPiece + (at === 0 ? 0 : handlingSeconds);
      free[at] = ends;
      return ends;
    }, 0),
  );
}
