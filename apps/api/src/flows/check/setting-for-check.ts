import { kitStackFaults, lacksDie, type ToolNeed } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { readSettings, stackOf, type NamedSetting } from '../../modules/hardware/read-settings.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import { linesWith } from '../run-hardware.ts';
import type { PlannedRun } from './runs-asked.ts';

/** What speaks against setting a run's hardware. */
export interface RunSetting {
  /** The dies that set it and are not in the shop. */
  dies: ToolNeed[];
  /** Posts and the like that do not fit the folded leather, in sentences. */
  misfits: string[];
}

/** Whether the hardware of each run can be set: the dies are here, and it fits the folded leather. */
export async function settingOf(
  em: EntityManager,
  planned: readonly PlannedRun[],
): Promise<RunSetting[]> {
  const leatherIds = planned.map(({ plan }) => plan.leatherId);
  const leathers = await em.find(Leather, { id: { $in: leatherIds } });
  const lines = planned.map(({ definition, option }) => linesWith(definition, option));
  const ids = lines.flat().map(({ hardwareId }) => hardwareId);
  const settings = await readSettings(em, [...new Set(ids)]);
  return planned.map(({ plan }, at) => {
    const leather = leathers.find(({ id }) => id === plan.leatherId) ?? null;
    const set = (lines[at] ?? []).flatMap((line) => {
      const kind = settings.get(line.hardwareId);
      return kind === undefined ? [] : [{ kind, stack: stackOf(line, leather) }];
    });
    return {
      dies: diesNeeded(set.flatMap(({ kind }) => [kind, ...kind.parts])),
      misfits: set.flatMap(({ kind, stack }) =>
        kitStackFaults(kind, kind.parts, stack).map((fault) => `${kind.name}: ${fault}`),
      ),
    };
  });
}

/** Each die once, with what it sets. */
function diesNeeded(kinds: readonly NamedSetting[]): ToolNeed[] {
  const lacking = kinds.filter(lacksDie);
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
