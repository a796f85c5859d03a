import { InvalidInput, NotWorkable } from '../errors/domain-error.ts';
import { checkOutline } from '../outline/check-outline.ts';
import type { Container, LayoutInput } from './layout.ts';

const mostPieces = 20_000;

/**
 * Refuses a layout that cannot be drawn: spacing and trim from 0 to 100 mm, container sides from 1
 * to 20,000 mm, and an outline as `checkOutline` wants it.
 * @throws InvalidInput
 */
export function checkLayoutInput(input: LayoutInput): void {
  checkOutline(input.outline);
  checkSide(input.spacingMm, 'spacingMm', 'spacing', 0, 100);
  checkSide(input.trimMm, 'trimMm', 'trim', 0, 100);
  checkContainer(input.container);
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

/** @throws NotWorkable where the picture alone would be too large */
export function checkPieceCount(bound: number): void {
  if (bound > mostPieces) {
    throw new NotWorkable(
      `More than ${mostPieces} pieces could lie there: work out a smaller panel and take several.`,
    );
  }
}
