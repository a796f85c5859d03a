import { InvalidInput } from '../errors/domain-error.ts';
import { type DrawnSide, soundSide } from '../leather/drawn-side.ts';
import { checkOutline } from '../outline/check-outline.ts';
import type { Container, LayoutInput, LayRules, SideInput } from './layout.ts';

/**
 * Refuses a layout that cannot be drawn: spacing and trim from 0 to 100 mm, container sides from 1
 * to 20,000 mm, and an outline as `checkOutline` wants it.
 * @throws InvalidInput
 */
export function checkLayoutInput(input: LayoutInput): void {
  checkRules(input);
  checkContainer(input.container);
}

/** The same for a side, which comes back in whole micrometres. @throws InvalidInput */
export function checkSideInput(input: SideInput): DrawnSide {
  checkRules(input);
  const { widestMm } = input;
  if (widestMm !== undefined) checkSide(widestMm, 'widestMm', 'widest strip', 1, 20_000);
  return soundSide(input.side);
}

function checkRules({ outline, spacingMm, trimMm }: LayRules): void {
  checkOutline(outline);
  checkSide(spacingMm, 'spacingMm', 'spacing', 0, 100);
  checkSide(trimMm, 'trimMm', 'trim', 0, 100);
}

export function checkContainer(container: Container): void {
  checkSide(container.widthMm, 'widthMm', 'width', 1, 20_000);
  if (container.form === 'panel') checkSide(container.heightMm, 'heightMm', 'height', 1, 20_000);
  else if (container.form !== 'strip') {
    throw new InvalidInput('form', 'Choose panel or strip.');
  } else if (container.lengthMm !== undefined) {
    checkSide(container.lengthMm, 'lengthMm', 'length', 1, 20_000);
  }
}

function checkSide(value: number, field: string, word: string, min: number, max: number): void {
  if (!(value >= min && value <= max)) {
    throw new InvalidInput(field, `Write the ${word} as ${min} to ${max} mm.`);
  }
}
