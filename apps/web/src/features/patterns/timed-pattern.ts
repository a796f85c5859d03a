import type { Pattern, PatternDefinition } from '@hidewright/contract';
import { ticketSteps } from '@hidewright/domain';
import { numberText } from '../../lib/formatting.ts';

/** The steps that can be timed: those of the ticket, where one figure for all of it is one step. */
export function timedSteps({ definition }: Pick<Pattern, 'definition'>) {
  return ticketSteps(definition.work);
}

/** "12 s per strike" as the pattern has it now. */
export function inWords(pattern: Pick<Pattern, 'definition'>, step: number): string {
  const timed = timedSteps(pattern)[step];
  return timed === undefined
    ? 'nothing'
    : `${numberText(timed.secondsPerUnit, 2)} s per ${timed.per}`;
}

/** A definition in which a step takes other seconds; minutes per 100 where the pattern has one figure. */
export function withSeconds(
  definition: PatternDefinition,
  step: number,
  seconds: number,
): PatternDefinition {
  const { work } = definition;
  if (work.kind === 'minutesPer100') {
    const minutes = Math.max(0.01, Math.round((seconds * 10_000) / 60) / 100);
    return { ...definition, work: { ...work, minutes: String(minutes) } };
  }
  const secondsPerUnit = String(Math.max(0.01, Math.round(seconds * 100) / 100));
  const steps = work.steps.map((each, at) => (at === step ? { ...each, secondsPerUnit } : each));
  return { ...definition, work: { ...work, steps } };
}
