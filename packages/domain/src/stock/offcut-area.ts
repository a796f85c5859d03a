import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, readDecimal, toAtMost, toText } from '../numbers/decimal-text.ts';

/** A piece that is cut off and kept: its size, its area, or both. */
export interface OffcutSize {
  widthMm: DecimalText | null;
  heightMm: DecimalText | null;
  /** as it was measured; null where it is width × height */
  areaMm2: DecimalText | null;
}

const noSize = 'Enter its width and height, or its area.';

/**
 * The area of an offcut, in mm² to a thousandth: width × height, or what was typed, which for a piece with a corner
 * gone is less than width × height.
 * @throws InvalidInput naming the field: half a size, neither size nor area, 0, or more than width × height
 */
export function offcutAreaMm2({ widthMm, heightMm, areaMm2 }: OffcutSize): DecimalText {
  if ((widthMm === null) !== (heightMm === null)) {
    const [field, word] = widthMm === null ? ['widthMm', 'width'] : ['heightMm', 'height'];
    throw new InvalidInput(field, `Enter its ${word} too, or neither and its area.`);
  }
  const typed = areaMm2 === null ? null : above0(areaMm2, 'areaMm2');
  if (widthMm === null || heightMm === null) {
    if (typed === null) throw new InvalidInput('widthMm', noSize);
    return toText(typed);
  }
  const box = toAtMost(above0(widthMm, 'widthMm').times(above0(heightMm, 'heightMm')), 3);
  if (typed?.gt(box))
    throw new InvalidInput(
      'areaMm2',
      'That is more than width × height. Enter less, or leave the area empty.',
    );
  return typed === null ? box : toText(typed);
}

function above0(text: DecimalText, field: string) {
  const number = readDecimal(text, field, { min: 0 });
  if (number.isZero()) throw new InvalidInput(field, noSize);
  return number;
}
