import type { z } from 'zod';

interface Waits {
  fromStep?: number | null | undefined;
}

interface Steps {
  hardware: readonly Waits[];
  options?: readonly { swaps: readonly Waits[] }[] | undefined;
  work:
    | { kind: 'minutesPer100' }
    | {
        kind: 'steps';
        steps: readonly {
          shortestWait?: string | null | undefined;
          longestWait?: string | null | undefined;
        }[];
      };
}

/** Hardware waits for a step that is there, and no step's longest wait is over before its shortest. */
export function refineSteps(
  { hardware, options = [], work }: Steps,
  context: z.RefinementCtx,
): void {
  const steps = work.kind === 'steps' ? work.steps : [{}];
  const sayOfMissing = (lines: readonly Waits[], path: (string | number)[]) =>
    lines.forEach(({ fromStep }, at) => {
      if (typeof fromStep !== 'number' || fromStep < steps.length) return;
      const message = 'There is no such step. Choose one of the steps.';
      context.addIssue({ code: 'custom', path: [...path, at, 'fromStep'], message });
    });
  sayOfMissing(hardware, ['hardware']);
  options.forEach(({ swaps }, at) => sayOfMissing(swaps, ['options', at, 'swaps']));
  steps.forEach(({ shortestWait, longestWait }, at) => {
    if (!shortestWait || !longestWait || Number(longestWait) >= Number(shortestWait)) return;
    const message = 'The longest wait is shorter than the shortest: write a longer one.';
    context.addIssue({ code: 'custom', path: ['work', 'steps', at, 'longestWait'], message });
  });
}

interface Options {
  hardware: readonly { hardwareId: number }[];
  options?:
    | readonly {
        name: string;
        swaps: readonly (Waits & { hardwareId: number | null; byHardwareId: number | null })[];
      }[]
    | undefined;
}

/** Options are told apart by name, and each changes something that the pattern has. */
export function refineOptions({ hardware, options = [] }: Options, context: z.RefinementCtx): void {
  const taken = new Set<number | null>(hardware.map(({ hardwareId }) => hardwareId));
  options.forEach(({ name, swaps }, at) => {
    const say = (path: (string | number)[], message: string) =>
      context.addIssue({ code: 'custom', path: ['options', at, ...path], message });
    if (options.findIndex((each) => each.name === name) !== at)
      say(['name'], 'Another option has this name. Give it one of its own.');
    swaps.forEach(({ hardwareId, byHardwareId, fromStep }, swap) => {
      const path = ['swaps', swap, 'hardwareId'];
      if (hardwareId === null && byHardwareId === null)
        say(path, 'Say what is left out, or what comes.');
      if (hardwareId !== null && !taken.has(hardwareId))
        say(path, 'The pattern does not take this hardware. Choose some that it takes.');
      if (hardwareId !== null && typeof fromStep === 'number')
        say(
          ['swaps', swap, 'fromStep'],
          'It goes by the line that it replaces: say the step there.',
        );
    });
  });
}
