import { describe, expect, it } from 'vitest';
import {
  piecesRun,
  piecesSpoiled,
  shareDone,
  stepLimits,
  type CountedStep,
} from './step-limits.ts';

const step = (per: CountedStep['per'], good = 0, rejects = 0, seconds = 0): CountedStep => ({
  per,
  good,
  rejects,
  seconds,
});
const job = { cutCount: 112, containers: 5 };

describe('stepLimits', () => {
  it('lets through what the steps before have left', () => {
    const steps = [
      step('panel', 5),
      step('strike', 105, 7),
      step('piece', 100, 3, 2),
      step('piece'),
      step('run'),
    ];
    expect(stepLimits(job, steps)).toEqual([5, 112, 105, 102, 1]);
  });

  it('keeps seconds in the run', () => {
    expect(stepLimits(job, [step('strike', 100, 0, 12), step('piece')])).toEqual([112, 112]);
  });

  it('does not subtract spoiled panels from pieces', () => {
    expect(stepLimits(job, [step('panel', 4, 1), step('piece')])).toEqual([5, 112]);
  });
});

describe('what a job has come to', () => {
  const steps = [step('panel', 4, 1), step('strike', 105, 7), step('piece', 60, 2, 1)];

  it('counts spoiled pieces, not panels', () => expect(piecesSpoiled(steps)).toBe(9));
  it('counts what went under the press by its busiest step', () =>
    expect(piecesRun(steps)).toBe(112));
  it('has run nothing where nobody counted', () => expect(piecesRun([step('run', 1)])).toBe(0));
  it('never shows more than all done', () => expect(shareDone(step('piece', 5), 4)).toBe(1));
  it('shows a step that nothing reaches as done', () =>
    expect(shareDone(step('piece'), 0)).toBe(1));
});
