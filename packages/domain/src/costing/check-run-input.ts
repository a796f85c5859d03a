import { InvalidInput } from '../errors/domain-error.ts';
import { readDecimal, readWhole } from '../numbers/decimal-text.ts';
import { checkWorkPlan } from '../work/work-plan.ts';
import {
  hardwarePers,
  type Break,
  type PriceRule,
  type RunHardware,
  type RunInput,
} from './run-input.ts';

const mostMoney = 1_000_000_000;
const mostPieces = 100_000;

/** Refuses a run whose numbers cannot be worked out, naming the field to change. @throws InvalidInput */
export function checkRunInput(input: RunInput): void {
  readWhole(input.minorDigits, 'minorDigits', 0, 2);
  checkBreaks(input.breaks);
  checkConfidence(input.confidencePercent);
  readWhole(input.layout.pieces, 'layout.pieces', 1);
  readDecimal(input.layout.containerAreaMm2, 'layout.containerAreaMm2', { min: 1 });
  checkWorkPlan(input.work);
  checkMaterials(input);
  checkOnce(input);
  checkHours(input);
  checkPrices(input);
}

function checkBreaks(breaks: readonly Break[]): void {
  if (breaks.length === 0) {
    throw new InvalidInput('breaks', 'Type at least one quantity to price.');
  }
  breaks.forEach(({ quantity, typedPrice, rule }, at) => {
    readWhole(quantity, `breaks.${at}.quantity`, 1, mostPieces);
    if (breaks.findIndex((each) => each.quantity === quantity) < at) {
      throw new InvalidInput(`breaks.${at}.quantity`, `${quantity} is there twice: keep it once.`);
    }
    if (typedPrice !== null) checkMoney(typedPrice, `breaks.${at}.typedPrice`, 4);
    if (rule) checkRule(rule, `breaks.${at}.rule`);
  });
}

function checkMaterials(input: RunInput): void {
  const { leather, supplies = [], options = [] } = input;
  checkMoney(leather.pricePerFt2, 'leather.pricePerFt2', 4);
  if (leather.extraPercent !== undefined) {
    readDecimal(leather.extraPercent, 'leather.extraPercent', { min: 0, max: 200 });
  }
  if (leather.whole) {
    readDecimal(leather.whole.areaMm2, 'leather.whole.areaMm2', { min: 1 });
    readDecimal(leather.whole.usablePercent, 'leather.whole.usablePercent', { min: 1, max: 100 });
  }
  checkHardware(input.hardware, 'hardware', input);
  supplies.forEach((supply, at) => {
    checkMoney(supply.unitPrice, `supplies.${at}.unitPrice`, 4);
    readDecimal(supply.quantity, `supplies.${at}.quantity`, { min: 0, max: 1_000_000 });
  });
  options.forEach(({ name, hardware, typedExtra }, at) => {
    if (name.trim() === '') throw new InvalidInput(`options.${at}.name`, 'Name the option.');
    checkHardware(hardware, `options.${at}.hardware`, input);
    if (typedExtra !== null) {
      readDecimal(typedExtra, `options.${at}.typedExtra`, { min: -mostMoney, max: mostMoney });
    }
  });
}

function checkHardware(lines: readonly RunHardware[], field: string, { work }: RunInput): void {
  const steps = work.kind === 'steps' ? work.steps.length : 1;
  lines.forEach(({ unitPrice, perPiece, per = 'piece', fromStep, lossPercent }, at) => {
    checkMoney(unitPrice, `${field}.${at}.unitPrice`, 4);
    readWhole(perPiece, `${field}.${at}.perPiece`, 1, 1_000_000);
    if (!hardwarePers.includes(per))
      throw new InvalidInput(`${field}.${at}.per`, `Count it by ${hardwarePers.join(', ')}.`);
    if (fromStep !== null && fromStep !== undefined) {
      readWhole(fromStep, `${field}.${at}.fromStep`, 0, steps - 1);
    }
    readDecimal(lossPercent ?? '0', `${field}.${at}.lossPercent`, { min: 0, max: 99 });
  });
}

function checkOnce(input: RunInput): void {
  const digits = input.minorDigits;
  input.tooling.forEach((each, at) => {
    checkMoney(each.cost, `tooling.${at}.cost`, digits);
    checkMoney(each.charge, `tooling.${at}.charge`, digits);
  });
  checkMoney(input.packingPerOrder, 'packingPerOrder', digits);
  checkMoney(input.packingPerPiece ?? '0', 'packingPerPiece', 4);
  checkMoney(input.carriage?.cost ?? '0', 'carriage.cost', digits);
  checkMoney(input.carriage?.charge ?? '0', 'carriage.charge', digits);
  checkMoney(input.setUpCharge ?? '0', 'setUpCharge', digits);
  checkMoney(input.minimumOrder ?? '0', 'minimumOrder', digits);
  readDecimal(input.rushPercent ?? '0', 'rushPercent', { min: 0, max: 500 });
  checkMoney(input.cardFee?.each ?? '0', 'cardFee.each', digits);
  readDecimal(input.cardFee?.percent ?? '0', 'cardFee.percent', { min: 0, max: 50 });
}

function checkHours(input: RunInput): void {
  checkMoney(input.wagePerHour, 'wagePerHour', 4);
  checkMoney(input.minimumWagePerHour ?? '0', 'minimumWagePerHour', 4);
  checkMoney(input.overheadPerHour ?? '0', 'overheadPerHour', 4);
  readDecimal(input.deskMinutesPerOrder, 'deskMinutesPerOrder', { min: 0, max: 1_000_000 });
}

function checkPrices(input: RunInput): void {
  checkMoney(input.targetPerHour, 'targetPerHour', 4);
  checkMoney(input.floorPrice ?? '0', 'floorPrice', 4);
  checkMoney(input.resalePrice ?? '0', 'resalePrice', 4);
  if (input.priceRule) checkRule(input.priceRule, 'priceRule');
  checkPriceStep(input.priceStep);
}

function checkRule(rule: PriceRule, field: string): void {
  if (rule.kind === 'fixed') checkMoney(rule.amount, `${field}.amount`, 4);
  if (rule.kind === 'markup')
    readDecimal(rule.percent, `${field}.percent`, { min: 0, max: 10_000 });
  if (rule.kind !== 'margin') return;
  if (readDecimal(rule.percent, `${field}.percent`, { min: 0 }).gte(95)) {
    throw new InvalidInput(
      `${field}.percent`,
      'A margin is a share of the price: write less than 95 %.',
    );
  }
}

const checkMoney = (text: string, field: string, places: number): unknown =>
  readDecimal(text, field, { min: 0, max: mostMoney, places });

function checkConfidence(percent: string): void {
  const value = readDecimal(percent, 'confidencePercent', { min: 1, places: 4 });
  if (value.gte(100)) {
    throw new InvalidInput(
      'confidencePercent',
      'Nothing is certain: write less than 100 %, such as 95.',
    );
  }
}

function checkPriceStep(text: string): void {
  if (readDecimal(text, 'priceStep', { min: 0, max: mostMoney, places: 4 }).isZero()) {
    throw new InvalidInput('priceStep', 'Write the price step as more than 0, such as 0.05.');
  }
}
