import { lacksDie, type ToolNeed } from '@hidewright/domain';
import type { SetLine } from '../set-hardware.ts';

/** The dies that set a run's hardware and are not in the shop: each once, with what it sets. */
export function diesNeeded(lines: readonly SetLine[]): ToolNeed[] {
  const lacking = lines.flatMap(({ kind }) => [kind, ...kind.parts]).filter(lacksDie);
  return [...new Set(lacking.map(({ settingDie }) => settingDie))].map((die) => {
    const sets = lacking.filter(({ settingDie }) => settingDie === die);
    const names = [...new Set(sets.map(({ name }) => name))];
    return {
      word: `Setting die ${die}`,
      choices: [],
      otherwise: `It sets ${names.join(' and ')}. Order it, or say at ${names[0]} that you have it.`,
      setsHardwareId: sets[0]?.id,
    };
  });
}
