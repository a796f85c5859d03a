import type { Pattern, PatternDefinition } from '@hidewright/contract';
import { countedWords, hardwarePers, perWords } from '@hidewright/domain';
import { countText, percentText, unitPriceText } from '../../lib/formatting.ts';

type Hardware = PatternDefinition['hardware'][number];
type Supply = NonNullable<PatternDefinition['supplies']>[number];
type Option = NonNullable<PatternDefinition['options']>[number];
type Learning = NonNullable<PatternDefinition['work']['learning']>;
type Names = ReadonlyMap<number, string>;

export const learningModels: Record<Learning['model'], string> = {
  unit: 'each piece (Crawford)',
  cumulative: 'running average (Wright)',
};

export const perChoices = hardwarePers.map((value) => ({ value, label: perWords[value] }));

const nameOf = (names: Names, id: number): string => names.get(id) ?? 'hardware no longer kept';

/** 2 × Rivet, from step 4 Fold and rivet on, 2 % spoiled; 45 ml of Edge dye, for 100 pieces */
export function hardwareWords(
  line: Hardware,
  { name, unit }: Pick<Pattern['hardware'][number], 'name' | 'unit'>,
  work: PatternDefinition['work'],
): string {
  const notes = [
    unit === 'piece'
      ? `${countText(line.perPiece)} × ${name}`
      : `${countedWords(line.perPiece, unit)} of ${name}`,
    ...(line.per === undefined || line.per === 'piece' ? [] : [perWords[line.per]]),
    ...(typeof line.fromStep === 'number' ? [fromStepWords(line.fromStep, work)] : []),
    ...(line.lossPercent === undefined ? [] : [`${percentText(line.lossPercent)} spoiled`]),
  ];
  return notes.join(', ');
}

function fromStepWords(step: number, work: PatternDefinition['work']): string {
  const name = work.kind === 'steps' ? work.steps[step]?.name : undefined;
  return name === undefined ? 'for every piece cut' : `from step ${step + 1} ${name} on`;
}

/** Edge dye, 1.80 for 100 pieces; without its cost for whoever may not see it. */
export function supplyWords({ name, cost, per }: Supply): string {
  return cost === undefined ? name : `${name}, ${unitPriceText(cost)} ${perWords[per]}`;
}

/** With a brass ring: 1 × D-ring in place of Buckle; 1 × Snap more, from step 4 Fold and rivet on */
export function optionWords(
  { name, swaps }: Option,
  names: Names,
  work: PatternDefinition['work'],
): string {
  return `${name}: ${swaps.map((swap) => swapWords(swap, names, work)).join('; ')}`;
}

function swapWords(
  { hardwareId, byHardwareId, perPiece, fromStep }: Option['swaps'][number],
  names: Names,
  work: PatternDefinition['work'],
) {
  const out = hardwareId === null ? undefined : nameOf(names, hardwareId);
  if (byHardwareId === null) return `without ${out ?? 'anything else'}`;
  const comes = `${countText(perPiece)} × ${nameOf(names, byHardwareId)}`;
  if (out !== undefined) return `${comes} in place of ${out}`;
  const from = typeof fromStep === 'number' ? `, ${fromStepWords(fromStep, work)}` : '';
  return `${comes} more${from}`;
}

/** each doubling leaves 90 %, running average (Wright), times from a run of 50 */
export function learningWords({ model, curvePercent, measuredAt }: Learning): string {
  return `each doubling leaves ${percentText(curvePercent)}, ${learningModels[model]}, times from a run of ${countText(measuredAt)}`;
}
