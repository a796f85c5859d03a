import { filled, pick } from './filled.ts';

type Typed = Record<string, unknown>;

/** A line of hardware; a step that is not there any more is none. */
export function hardwareBody(line: Typed, steps: number): Typed {
  const fromStep = line['fromStep'];
  const gone = typeof fromStep === 'number' && fromStep >= steps;
  return {
    ...pick(line, ['hardwareId', 'perPiece']),
    ...filled({
      per: line['per'] === 'piece' ? undefined : line['per'],
      fromStep: gone ? undefined : fromStep,
      lossPercent: line['lossPercent'],
      layers: line['layers'],
    }),
  };
}

/** Supplies and options, each left out where there is none. */
export function partsBody({ supplies, options }: Typed): Typed {
  const lines = (supplies ?? []) as Typed[];
  const named = (options ?? []) as Typed[];
  return {
    ...(lines.length > 0 && { supplies: lines.map((line) => pick(line, ['name', 'cost', 'per'])) }),
    ...(named.length > 0 && { options: named.map(optionBody) }),
  };
}

function optionBody({ name, swaps }: Typed): Typed {
  return { name, swaps: ((swaps ?? []) as Typed[]).map(swapBody) };
}

/** What only stays out comes in no number. */
function swapBody({ hardwareId, byHardwareId, perPiece }: Typed): Typed {
  const out = hardwareId === '' ? null : (hardwareId ?? null);
  const comes = byHardwareId === '' ? null : (byHardwareId ?? null);
  return { hardwareId: out, byHardwareId: comes, perPiece: comes === null ? 1 : perPiece };
}

export const blankHardware = { perPiece: 1, per: 'piece' };

export const blankSwap = { hardwareId: null, byHardwareId: null, perPiece: 1 };

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
