import type { NestProblem, Rotations } from '../nest/problem.ts';
import { outlinePolygon } from '../outline/polygon.ts';
import type { Container, LayRules, SideInput, Turns } from './layout.ts';

const rotations: Record<Turns, Rotations> = {
  'with the spine': [0, 180],
  'quarter turns': [0, 90, 180, 270],
  free: 'free',
};

function rulesOf({ outline, spacingMm, trimMm, turns = 'quarter turns' }: LayRules) {
  return {
    outline: outlinePolygon(outline),
    gap: spacingMm,
    trim: trimMm,
    // Turning a round piece changes nothing but the time that it takes.
    rotations: outline.shape === 'round' ? [0] : rotations[turns],
  };
}

/** A strip without an end, as the engine takes it. */
export function stripProblem(rules: LayRules, { widthMm }: Container): NestProblem {
  return { ...rulesOf(rules), container: { type: 'strip', width: widthMm } };
}

/** A panel, or a strip of some length, as the engine takes it. */
export function containerProblem(rules: LayRules, container: Container): NestProblem {
  const [w, h] =
    container.form === 'panel'
      ? [container.widthMm, container.heightMm]
      : [container.lengthMm ?? 0, container.widthMm];
  return { ...rulesOf(rules), container: { type: 'rect', w, h } };
}

/** A side with its flaws, around which the trim is kept as well. */
export function sideProblem(input: SideInput): NestProblem {
  return {
    ...rulesOf(input),
    container: { type: 'polygon', points: input.side.outline },
    holes: input.side.flaws,
    flawClearance: input.trimMm,
  };
}
