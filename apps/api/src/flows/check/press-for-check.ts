import { outlineOf, type CheckAnswer } from '@hidewright/contract';
import {
  cuttingEdgeMm,
  pressLoad,
  takesPanel,
  toAtMost,
  Exact,
  type Load,
} from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Press } from '../../modules/presses/press.entity.ts';
import type { Tool } from '../../modules/tools/tool.entity.ts';
import { limitsOf } from '../press-reach.ts';
import type { PlannedRun } from './runs-asked.ts';

/**
 * Whether a press manages one strike of a run, by its owner's own figures. Without a press on record, or without a
 * figure or an outline, nothing speaks against it, and nothing is said.
 */
export async function pressForCheck(
  em: EntityManager,
  { plan, definition, sides }: PlannedRun,
  tools: readonly Tool[],
): Promise<CheckAnswer | null> {
  if (!plan.needsDie || definition.outline === null) return null;
  const presses = await em.find(Press, { active: true }, { orderBy: { id: 'asc' } });
  const die = tools.find(({ kind }) => kind === 'cutting die');
  const plate = tools.find(({ kind }) => kind === 'stamp plate');
  const edge = cuttingEdgeMm(outlineOf(definition.outline)) * (die?.piecesPerStrike ?? 1);
  const reliefAreaMm2 = plate?.reliefAreaMm2?.toNumber() ?? null;
  const known = presses.flatMap((press) => {
    const load = pressLoad(limitsOf(press), { cuttingEdgeMm: edge, reliefAreaMm2 });
    return load.rule === null ? [] : [{ press, rule: load.rule, relief: load.relief }];
  });
  const manages = known.find(({ rule, relief }) => fits(rule) && (relief === null || fits(relief)));
  const chosen = manages ?? known[0];
  return chosen === undefined
    ? null
    : toAnswer(chosen, {
        ok: manages !== undefined,
        whole: sides === null || takesWhole(chosen.press, sides),
      });
}

const fits = ({ word }: Load): boolean => word !== 'too much';

const takesWhole = (press: Press, { widthMm, heightMm }: { widthMm: number; heightMm: number }) =>
  takesPanel(limitsOf(press), widthMm, heightMm);

const text = (value: number): string => toAtMost(new Exact(value), 1);

function toAnswer(
  { press, rule, relief }: { press: Press; rule: Load; relief: Load | null },
  { ok, whole }: { ok: boolean; whole: boolean },
): CheckAnswer {
  const beyond = fits(rule) ? (relief ?? rule) : rule;
  const what = beyond === rule ? 'mm of cutting edge' : 'mm² of relief';
  const round = (value: number) => Math.round(value).toLocaleString('en-GB');
  const sentence = ok
    ? `Press: ${press.name} manages it ${rule.word}, ${round(rule.asked)} of ${round(rule.manages)} mm of cutting edge.${whole ? '' : ' Cut the panels narrower first: they do not go in whole.'}`
    : `Press: one strike asks for ${round(beyond.asked)} ${what}, and ${press.name} manages ${round(beyond.manages)}. Strike fewer at a time, or have it struck elsewhere.`;
  return {
    about: 'press',
    name: press.name,
    hardwareId: null,
    unit: 'mm',
    needed: text(rule.asked),
    freeNow: text(rule.manages),
    free: text(rule.manages),
    short: text(Math.max(0, rule.asked - rule.manages)),
    enough: ok,
    enoughOn: null,
    toBuy: false,
    sentence,
  };
}
