import { planRegular } from '../nest/plan-regular.ts';
import { planSideStrips } from '../nest/side-strips.ts';
import { checkLayoutInput, checkSideInput } from './check-layout-input.ts';
import type { Layout, LayoutInput, SideInput, SideLayout } from './layout.ts';
import { layIn, lieOf, type Watch } from './lie.ts';
import { containerProblem, sideProblem, stripProblem } from './nest-problem.ts';
import { areaOfContainer, areaOfSide } from './shares.ts';
import { sideCuts } from './side-cuts.ts';

/**
 * Lays copies of an outline on a panel or a strip: in rows that a person repeats by hand, or as the
 * most pieces found anyhow. The same input always gives the same layout; an outline that does not
 * fit gives none. Curves are followed within 0.01 mm; spacing is kept within 0.001 mm of the
 * polygon.
 * @throws InvalidInput · NotWorkable beyond 20,000 pieces
 */
export function layOut(input: LayoutInput, watch: Watch = {}): Layout {
  checkLayoutInput(input);
  const { container } = input;
  const asStrip = stripProblem(input, container);
  const endless = container.form === 'strip' ? planRegular(asStrip) : null;
  const period = endless?.period ?? null;
  const strip = {
    container,
    mmPerPiece: period && tidy(period.mm / period.pieces),
    period: period && { mm: tidy(period.mm), pieces: period.pieces },
  };
  const area = areaOfContainer(container, period?.mm ?? 0);
  if (endless && container.form === 'strip' && container.lengthMm === undefined) {
    const placements = endless.placements.slice(0, period?.pieces ?? 0);
    const found = { rows: endless, placements, anyhow: false };
    return { ...lieOf(input, area, asStrip, found), ...strip };
  }
  return { ...layIn(input, area, containerProblem(input, container), watch), ...strip };
}

const tidy = (value: number): number => Math.round(value * 1e4) / 1e4;

/**
 * The same on a side or hide as it was drawn, clear of its edge and its flaws; in rows within strips
 * that it is cut into first, where the input says how wide they may be.
 * @throws InvalidInput · NotWorkable beyond 20,000 pieces
 */
export function layOutSide(input: SideInput, watch: Watch = {}): SideLayout {
  const side = checkSideInput(input);
  const sound = { ...input, side };
  const [area, problem] = [areaOfSide(side), sideProblem(sound)];
  const { widestMm } = input;
  if (widestMm === undefined) return { ...layIn(input, area, problem, watch), side, cuts: null };
  const plan = planSideStrips(problem, widestMm);
  const lie = lieOf(input, area, problem, {
    rows: plan,
    placements: plan.placements,
    anyhow: false,
  });
  return { ...lie, side, cuts: sideCuts(sound, plan, lie.placements) };
}
