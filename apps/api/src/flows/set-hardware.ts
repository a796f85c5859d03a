import type { PatternDefinition } from '@hidewright/contract';
import { kitStackFaults, type LeatherWeight } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { readSettings, type KitSetting } from '../modules/hardware/read-settings.ts';
import { linesWith } from './run-hardware.ts';

/** A line of a pattern's hardware, with what is known of setting it. */
export interface SetLine {
  kind: KitSetting;
  /** Layers of leather that it is set through; null where nobody said. */
  layers: number | null;
}

interface Made {
  definition: PatternDefinition;
  /** Of the pattern, or as it is. */
  option: string | null;
}

/** The hardware that is set in each of these runs; in one question whatever the number. */
export async function readSetLines(em: EntityManager, runs: readonly Made[]): Promise<SetLine[][]> {
  const lines = runs.map(({ definition, option }) => linesWith(definition, option));
  const settings = await readSettings(
    em,
    lines.flat().map(({ hardwareId }) => hardwareId),
  );
  return lines.map((ofRun) =>
    ofRun.flatMap(({ hardwareId, layers = null }) => {
      const kind = settings.get(hardwareId);
      return kind === undefined ? [] : [{ kind, layers }];
    }),
  );
}

/** Posts and the like that do not fit the folded leather, in sentences. */
export const misfitsThrough = (
  lines: readonly SetLine[],
  weights: readonly LeatherWeight[],
): string[] =>
  lines.flatMap(({ kind, layers }) =>
    weights
      .flatMap((weight) => kitStackFaults(kind, kind.parts, { ...weight, layers }))
      .map((fault) => `${kind.name}: ${fault}`),
  );
