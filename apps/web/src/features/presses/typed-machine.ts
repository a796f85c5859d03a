import type { Workshop } from '@hidewright/contract';
import { InvalidInput, machinePays, type Machine, type MachinePays } from '@hidewright/domain';

/** A press or a die as it is being typed: every field is text. */
export type TypedMachine = Record<keyof Machine, string>;

/** What an hour is worth begins with the shop's target; the rest is a first guess to be typed over. */
export const startingMachine = ({ targetPerHour }: Workshop): TypedMachine => ({
  price: '',
  minutesSavedPerRun: '',
  runsPerMonth: '',
  hourWorth: targetPerHour ?? '',
  upkeepPerYear: '0',
  years: '5',
  interestPercent: '5',
});

export type MachineAnswer = { pays: MachinePays } | { field: string; why: string };

/** Whether it pays by what is typed so far, or which field must change first. */
export function answerFor(typed: TypedMachine): MachineAnswer {
  try {
    return { pays: machinePays({ ...typed, years: Number(typed.years.trim() || 'none') }) };
  } catch (error) {
    if (error instanceof InvalidInput) return { field: error.field, why: error.message };
    throw error;
  }
}
