import { filled, pick } from './filled.ts';

type Typed = Record<string, unknown>;

/** A line of hardware. */
export function hardwareBody(line: Typed, steps: number): Typed {
  return {
    ...pick(line, ['hardwareId', 'perPiece']),
    ...filled({
      per: line['per'] === 'piece' ? undefined : line['per'],
      fromStep: stepOf(line, steps),
      lossPercent: line['lossPercent'],
      layers: line['layers'],
    }),
  };
}

/** The step that it waits for; one that is not there any more is none. */
function stepOf({ fromStep }: Typed, steps: number): unknown {
  return typeof fromStep === 'number' && fromStep >= steps ? undefined : fromStep;
}

/** Supplies and options, each left out where there is none. */
export function partsBody({ supplies, options }: Typed, steps: number): Typed {
  const lines = (supplies ?? []) as Typed[];
  const named = (options ?? []) as Typed[];
  return {
    ...(lines.length > 0 && { supplies: lines.map((line) => pick(line, ['name', 'cost', 'per'])) }),
    ...(named.length > 0 && { options: named.map((option) => optionBody(option, steps)) }),
  };
}

function optionBody({ name, swaps }: Typed, steps: number): Typed {
  return { name, swaps: ((swaps ?? []) as Typed[]).map((swap) => swapBody(swap, steps)) };
}

/** What only stays out comes in no number; what takes a place is needed from the same step on, unsaid. */
function swapBody({ hardwareId, byHardwareId, perPiece, ...swap }: Typed, steps: number): Typed {
  const out = hardwareId === '' ? null : (hardwareId ?? null);
  const comes = byHardwareId === '' ? null : (byHardwareId ?? null);
  return {
    ...{ hardwareId: out, byHardwareId: comes, perPiece: comes === null ? 1 : perPiece },
    ...(out === null && filled({ fromStep: stepOf(swap, steps) })),
  };
}

export const blankHardware = { perPiece: 1, per: 'piece' };

export const blankSwap = { hardwareId: null, byHardwareId: null, perPiece: 1 };

/** Where the form keeps lines that may wait for a step: the pattern's own, and those of its options. */
export function linesThatWait({ hardware, options }: Typed): string[] {
  const listed = (value: unknown) => (value ?? []) as Typed[];
  return [
    ...listed(hardware).map((_, at) => `definition.hardware.${at}`),
    ...listed(options).flatMap(({ swaps }, option) =>
      listed(swaps).map((_, at) => `definition.options.${option}.swaps.${at}`),
    ),
  ];
}

/** The step that hardware waits for, after the steps have changed places. */
export function afterMove(step: number, from: number, to: number): number {
  if (step === from) return to;
  if (from < step && step <= to) return step - 1;
  if (to <= step && step < from) return step + 1;
  return step;
}

/** The step that hardware waits for, after one was taken out; none if it was that one. */
export function afterRemoval(step: number, removed: number): number | undefined {
  if (step === removed) return undefined;
  return step > removed ? step - 1 : step;
}
