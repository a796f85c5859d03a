import type { Pattern } from '@hidewright/contract';
import { waysOfWorking, type WayOfWorking } from '@hidewright/domain';

export type Steps = Extract<Pattern['definition']['work'], { kind: 'steps' }>['steps'];

/** What is asked about a run of the pattern. */
interface WaysAsked {
  pieces: number;
  /** pieces handed on together in the way between the two others */
  transfer: number;
  handlingSeconds: number;
  hands: 'one' | 'each';
}

export interface Way extends WayOfWorking {
  name: string;
  /** Where pieces would lie longer than they may. */
  cautions: string[];
}

/**
 * One at a time, in batches, and step by step, side by side.
 * @param perContainer pieces from a panel or strip, over which the steps counted per panel or strip are spread
 * @throws InvalidInput
 */
export function waysFor(steps: Steps, perContainer: number, asked: WaysAsked): Way[] {
  const { pieces, transfer, handlingSeconds, hands } = asked;
  const timed = steps.map((step) => timesOf(step, perContainer));
  const batches = [1, transfer, pieces];
  const ways = waysOfWorking({ pieces, steps: timed, handlingSeconds, batches, hands });
  const names = ['one at a time', `in batches of ${transfer}`, 'step by step'];
  return ways.map((way, at) => {
    const lying = longestLying({ ...asked, transfer: way.batch }, timed);
    return { ...way, name: names[at] ?? '', cautions: cautionsFor(steps, lying) };
  });
}

interface Timed {
  secondsPerPiece: number;
  setupMinutes: number;
}

/** A step for the whole run is done once, as setting up is. */
function timesOf(step: Steps[number], perContainer: number): Timed {
  const [seconds, setupMinutes] = [Number(step.secondsPerUnit), Number(step.setupMinutes)];
  if (step.per === 'run') return { secondsPerPiece: 0, setupMinutes: setupMinutes + seconds / 60 };
  const pieces = step.per === 'piece' || step.per === 'strike' ? 1 : Math.max(perContainer, 1);
  return { secondsPerPiece: seconds / pieces, setupMinutes };
}

/**
 * How long a piece lies at most between each step and the next, in seconds: while the rest of its
 * batch is finished or comes before it, while it is handed on, and, with somebody at each step, while
 * the batch waits its turn.
 */
function longestLying(
  { pieces, transfer, handlingSeconds, hands }: WaysAsked,
  steps: readonly Timed[],
): number[] {
  const free = steps.map(({ setupMinutes }) => (hands === 'each' ? setupMinutes * 60 : 0));
  const lying = steps.map(() => 0);
  for (let left = pieces; left > 0; left -= transfer) {
    const size = Math.min(left, transfer);
    let ready = 0;
    steps.forEach(({ secondsPerPiece }, at) => {
      const begins = hands === 'each' ? Math.max(ready, free[at] ?? 0) : ready;
      const before = steps[at - 1];
      if (before) {
        const slower = Math.max(before.secondsPerPiece, secondsPerPiece);
        const lies = begins - ready + (size - 1) * slower + handlingSeconds;
        lying[at - 1] = Math.max(lying[at - 1] ?? 0, lies);
      }
      ready = begins + size * secondsPerPiece + (before ? handlingSeconds : 0);
      free[at] = ready;
    });
  }
  return lying;
}

function cautionsFor(steps: Steps, lying: readonly number[]): string[] {
  return steps.flatMap(({ name, longestWait }, at) => {
    if (!longestWait || at === steps.length - 1) return [];
    if ((lying[at] ?? 0) <= Number(longestWait) * 60) return [];
    return [`would lie longer than ${longestWait} min after ${name}`];
  });
}
