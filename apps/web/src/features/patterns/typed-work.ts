import type { PatternDefinition } from '@hidewright/contract';
import { filled, pick } from './filled.ts';

type Typed = Record<string, unknown>;

/** A step as it is before anything is typed. */
export const blankStep = {
  name: '',
  per: 'piece',
  setupMinutes: '0',
  secondsPerUnit: '',
  rejectPercent: '0',
};

export const blankWork = {
  kind: 'minutesPer100',
  minutes: '',
  rejectPercent: '',
  steps: [blankStep],
  secondsPercent: '',
  learning: { model: '', curvePercent: '', measuredAt: '' },
};

/** The work as the form takes it up again. */
export function typedWork(work: PatternDefinition['work']): Typed {
  const learning = { ...blankWork.learning, ...work.learning };
  return { ...blankWork, rejectPercent: '0', ...work, learning };
}

const always = ['name', 'setupMinutes', 'secondsPerUnit', 'per', 'rejectPercent'];
const ifTyped = ['people', 'shortestWait', 'longestWait', 'pieceRate'];

/** Of all that is typed about the work, what the chosen way needs. */
export function workBody(work: Typed): Typed {
  const learning = work['learning'] as Typed | undefined;
  return {
    kind: work['kind'],
    ...(work['kind'] === 'steps'
      ? { steps: stepsOf(work).map(stepBody) }
      : pick(work, ['minutes', 'rejectPercent'])),
    ...filled(pick(work, ['secondsPercent'])),
    ...(Boolean(learning?.['model']) && { learning }),
  };
}

function stepBody(step: Typed): Typed {
  return {
    ...pick(step, always),
    ...(step['unattended'] === true && { unattended: true }),
    ...filled(pick(step, ifTyped)),
  };
}

/** How many steps hardware can wait for; one figure for all of the work is a single step. */
export function stepCount(work: Typed): number {
  return work['kind'] === 'steps' ? stepsOf(work).length : 1;
}

function stepsOf(work: Typed): Typed[] {
  return (work['steps'] ?? []) as Typed[];
}
