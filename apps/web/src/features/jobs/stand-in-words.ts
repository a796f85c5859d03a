import type { JobHardware } from '@hidewright/contract';

type StandsIn = Pick<JobHardware, 'needed' | 'standsInFor'>;

/** Can stand in for Rivet 9 mm; empty of what is needed itself. */
export function standsInText({ needed, standsInFor }: StandsIn): string {
  if (needed > 0 || standsInFor.length === 0) return '';
  const lines = standsInFor.map(({ name, inKit }) =>
    inKit === null ? name : `${name} as part of ${inKit}`,
  );
  return `can stand in for ${lines.join(' and ')}`;
}
