import { takesPanel, widestStripMm, type DrawnSide, type PressLimits } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Press } from '../modules/presses/press.entity.ts';

/** Without a press on record: what most hand presses take, common practice, no source. */
const usualMm = 300;

/** What the presses in use take, together. */
export interface PressReach {
  widestStripMm: number;
  /** Whether some press takes the side whole; without a press on record nothing speaks against it. */
  takesWhole(side: DrawnSide): boolean;
}

export async function pressReach(em: EntityManager): Promise<PressReach> {
  const presses = (await em.find(Press, { active: true })).map(limitsOf);
  return {
    widestStripMm: Math.max(0, ...presses.map(widestStripMm)) || usualMm,
    takesWhole: ({ outline }) => {
      const [width, height] = [
        spanOf(outline.map(({ x }) => x)),
        spanOf(outline.map(({ y }) => y)),
      ];
      return presses.length === 0 || presses.some((press) => takesPanel(press, width, height));
    },
  };
}

const spanOf = (values: readonly number[]): number => Math.max(...values) - Math.min(...values);

/** A press as far as reach and load go. */
export const limitsOf = (press: Press): PressLimits => ({
  ...bedOf(press),
  ruleMm: press.ruleMm?.toNumber() ?? null,
  reliefAreaMm2: press.reliefAreaMm2?.toNumber() ?? null,
});

const bedOf = ({ bedDepthMm, bedWidthMm, throatMm }: Press) => ({
  bedWidthMm: bedWidthMm.toNumber(),
  bedDepthMm: bedDepthMm.toNumber(),
  throatMm: throatMm?.toNumber() ?? null,
});
