import { InvalidInput } from '../errors/domain-error.ts';
import { readDecimal, readWhole } from '../numbers/decimal-text.ts';
import { checkWorkPlan } from '../work/work-plan.ts';
import type { Break, RunInput } from './run-input.ts';

const mostMoney = 1_000_000_000;
const mostPieces = 100_000;

/** Refuses a run whose numbers cannot be worked out, naming the field to change. @throws InvalidInput */
export function checkRunInput(input: RunInput): void {
  readWhole(input.minorDigits, 'minorDigits', 0, 2);
  checkBreaks(input.breaks);
  checkConfidence(input.confidencePercent);
  readWhole(input.layout.pieces, 'layout.pieces', 1);
  readDecimal(input.layout.containerAreaMm2, 'layout.containerAreaMm2', { min: 1 });
  checkMoney(input.leather.pricePerFt2, 'leather.pricePerFt2', 4);
  input.hardware.forEach((each, at) => {
    checkMoney(each.unitPrice, `hardware.${at}.unitPrice`, 4);
    readWhole(each.perPiece, `hardware.${at}.perPiece`, 1, 10_000);
  });
  input.tooling.forEach((each, at) => {
    checkMoney(each.cost, `tooling.${at}.cost`, input.minorDigits);
    checkMoney(each.charge, `tooling.${at}.charge`, input.minorDigits);
  });
  checkWorkPlan(input.work);
  checkMoney(input.wagePerHour, 'wagePerHour', 4);
  readDecimal(input.deskMinutesPerOrder, 'deskMinutesPerOrder', { min: 0, max: 1_000_000 });
  checkMoney(input.packingPerOrder, 'packingPerOrder', input.minorDigits);
  checkMoney(input.targetPerHour, 'targetPerHour', 4);
  checkPriceStep(input.priceStep);
}

function checkBreaks(breaks: readonly Break[]): void {
  if (breaks.length === 0) {
    throw new InvalidInput('breaks', 'Type at least one quantity to price.');
  }
  breaks.forEach(({ quantity, typedPrice }, at) => {
    readWhole(quantity, `breaks.${at}.quantity`, 1, mostPieces);
    if (breaks.findIndex((each) => each.quantity === quantity) < at) {
      throw new InvalidInput(`breaks.${at}.quantity`, `${quantity} is there twice: keep it once.`);
    }
    if (typedPrice !== null) checkMoney(typedPrice, `breaks.${at}.typedPrice`, 4);
  });
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
