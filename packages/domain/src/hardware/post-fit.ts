import type { Decimal } from 'decimal.js';
import type { LeatherWeight } from '../leather/leather-weight.ts';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
} from '../numbers/decimal-text.ts';
import { tagWords } from '../stock/tag-words.ts';
import { convert } from '../units/convert.ts';

/** Hardware that is set through leather, as far as it is known. Lengths in mm, 0 or more. */
export interface Setting {
  postLengthMm: DecimalText | null;
  /** the folded stack that it holds */
  stackMinMm: DecimalText | null;
  stackMaxMm: DecimalText | null;
  /** the die that sets it; empty where none is needed */
  settingDie: string;
  settingDieHere: boolean;
}

/** What it is set through. */
export interface Stack extends LeatherWeight {
  /** layers of leather on top of each other, 1 to 20; null where nobody said: one on another, two */
  layers: number | null;
}

const usualLayers = 2;
const numbers = ['No layer', 'One layer', 'Two layers', 'Three layers', 'Four layers'];

/**
 * What is wrong with setting a hardware through a folded stack, in sentences: the stack is layers × weight, at 1 oz =
 * 1/64 in (ASTM D1814-70, 2000, §1.2). Nothing where it fits, or where too little is known to say.
 * @throws InvalidInput
 */
export function settingFaults(setting: Setting, stack: Stack): string[] {
  return [...stackFaults(setting, stack), ...dieFaults(setting)];
}

/** The same of a kit: its own faults and those of each part, which is named. @throws InvalidInput */
export function kitSettingFaults(
  kit: Setting,
  parts: readonly (Setting & { name: string })[],
  stack: Stack,
): string[] {
  return throughKit(kit, parts, (setting) => settingFaults(setting, stack));
}

/** Of a kit, what does not fit the folded stack alone, whatever dies are in the shop. @throws InvalidInput */
export function kitStackFaults(
  kit: Setting,
  parts: readonly (Setting & { name: string })[],
  stack: Stack,
): string[] {
  return throughKit(kit, parts, (setting) => stackFaults(setting, stack));
}

function throughKit(
  kit: Setting,
  parts: readonly (Setting & { name: string })[],
  faultsOf: (setting: Setting) => string[],
): string[] {
  const ofParts = parts.flatMap((part) => faultsOf(part).map((fault) => `${part.name}: ${fault}`));
  return [...faultsOf(kit), ...ofParts];
}

/** Whether the die that sets it is needed and not in the shop. */
export const lacksDie = ({ settingDie, settingDieHere }: Setting): boolean =>
  settingDie !== '' && !settingDieHere;

function stackFaults(setting: Setting, stack: Stack): string[] {
  const { weightLowOz, weightHighOz, lots = [] } = stack;
  const layers = stack.layers ?? usualLayers;
  readWhole(layers, 'layers', 1, 20);
  if (weightLowOz === null) return [];
  const thick = (oz: DecimalText, field: string) =>
    convert(readDecimal(oz, field, { min: 0 }), 'oz', 'mm').times(layers);
  const low = thick(weightLowOz, 'weightLowOz');
  const high = thick(weightHighOz ?? weightLowOz, 'weightHighOz');
  const verdict = verdictOn(setting, low, high);
  if (verdict === null) return [];
  const weight = rangeText(new Exact(weightLowOz), new Exact(weightHighOz ?? weightLowOz), 3);
  const are = layers === 1 ? 'is' : 'are';
  const leather = leatherWords(`${weight} oz`, lots);
  const stacked = `${numbers[layers] ?? `${layers} layers`} of ${leather} ${are} ${rangeText(low, high, 1)} mm`;
  const other = lots.length === 0 ? '' : ' Or cut from another lot.';
  return [`${holds(setting)}${stacked}: ${verdict}${other}`];
}

/** 5 to 6 oz; or lots OT-118 and OT-119, at 3 oz, */
function leatherWords(weight: string, lots: readonly string[]): string {
  if (lots.length === 0) return weight;
  return `${lots.length === 1 ? 'lot' : 'lots'} ${tagWords(lots)}, at ${weight},`;
}

/** What the hardware is made for, before what it is to be set through. */
function holds({ postLengthMm, stackMinMm, stackMaxMm }: Setting): string {
  const post = postLengthMm === null ? '' : `The post is ${postLengthMm} mm`;
  if (stackMaxMm === null) return `${post}. `;
  const range =
    stackMinMm === null
      ? `up to ${stackMaxMm} mm`
      : `${rangeText(new Exact(stackMinMm), new Exact(stackMaxMm), 3)} mm`;
  return `${post === '' ? 'It' : `${post} and`} holds ${range}. `;
}

function verdictOn(
  { postLengthMm, stackMinMm, stackMaxMm }: Setting,
  low: Decimal,
  high: Decimal,
): string | null {
  // Without a stack that it is known to hold, only a post that does not even come through is certainly wrong.
  const most = stackMaxMm ?? postLengthMm;
  const upTo = low.eq(high) ? '' : 'up to ';
  if (most !== null && high.gt(most)) {
    const by = toAtMost(high.minus(most), 1);
    return stackMaxMm === null
      ? 'it does not come through. Take a longer one.'
      : `${upTo}${by} mm too thick. Take a longer one, or fewer layers.`;
  }
  if (stackMinMm !== null && low.lt(stackMinMm)) {
    const by = toAtMost(new Exact(stackMinMm).minus(low), 1);
    return `${upTo}${by} mm too thin. Take a shorter one, or add a layer.`;
  }
  return null;
}

const dieFaults = (setting: Setting): string[] =>
  lacksDie(setting)
    ? [`It is set with the die ${setting.settingDie}, which is not in the shop.`]
    : [];

/** 4 to 4.8, or one figure where both are the same. */
function rangeText(low: Decimal, high: Decimal, places: number): string {
  const [from, to] = [toAtMost(low, places), toAtMost(high, places)];
  return from === to ? from : `${from} to ${to}`;
}
