import { matchSteps } from '@hidewright/domain';
import { z } from 'zod';
import { id, percent, positiveCount } from './fields.ts';
import type { PatternDefinition } from './patterns.ts';

const figure = z.string();

/** What runs say of a pattern's minutes, rejects, leather and hardware; what is left out stays as the pattern has it. */
export const runEstimate = z
  .strictObject({
    /** Of a pattern whose work is one figure. */
    minutesPer100: figure.optional(),
    rejectPercent: figure.optional(),
    /** Of a pattern that is worked step by step; a step is known by its name and what it is counted per. */
    steps: z
      .array(
        z.strictObject({
          name: z.string(),
          per: z.string(),
          setupMinutes: figure.optional(),
          secondsPerUnit: figure.optional(),
          rejectPercent: figure.optional(),
        }),
      )
      .default([]),
    leatherExtraPercent: percent.optional(),
    hardware: z.array(z.strictObject({ hardwareId: id, lossPercent: percent })).default([]),
    /** The pieces behind the rejects; null where none stand behind them. */
    history: z.strictObject({ good: positiveCount, total: positiveCount }).nullable().optional(),
  })
  .meta({ id: 'RunEstimate' });
export type RunEstimate = z.infer<typeof runEstimate>;

/** A pattern with what runs say of it in place of what it says itself. */
export function withEstimate(
  definition: PatternDefinition,
  estimate: RunEstimate,
): PatternDefinition {
  const { leatherExtraPercent = definition.leatherExtraPercent, history } = estimate;
  return {
    ...definition,
    work: workWith(definition.work, estimate),
    ...(leatherExtraPercent !== undefined && { leatherExtraPercent }),
    hardware: definition.hardware.map((line) => {
      const found = estimate.hardware.find(({ hardwareId }) => hardwareId === line.hardwareId);
      return found === undefined ? line : { ...line, lossPercent: found.lossPercent };
    }),
    history: history === undefined ? definition.history : history,
  };
}

function workWith(
  work: PatternDefinition['work'],
  { minutesPer100, rejectPercent, steps }: RunEstimate,
): PatternDefinition['work'] {
  if (work.kind === 'minutesPer100') {
    const { minutes, rejectPercent: said } = work;
    return {
      ...work,
      minutes: minutesPer100 ?? minutes,
      rejectPercent: rejectPercent ?? said,
    };
  }
  const found = matchSteps(work.steps, steps);
  return {
    ...work,
    steps: work.steps.map((step, at) => {
      const figures = steps[found[at] ?? -1];
      return {
        ...step,
        setupMinutes: figures?.setupMinutes ?? step.setupMinutes,
        secondsPerUnit: figures?.secondsPerUnit ?? step.secondsPerUnit,
        rejectPercent: figures?.rejectPercent ?? step.rejectPercent,
      };
    }),
  };
}
