import { ScaledDecimal } from './scaled-decimal.ts';

/** Money in whole currency units, kept in hundredths. */
export class MoneyType extends ScaledDecimal {
  override readonly places = 2;
}

/** The price or cost of one priced unit, kept in ten-thousandths. */
export class UnitPriceType extends ScaledDecimal {
  override readonly places = 4;
}

/** An area in mm², kept in thousandths. */
export class AreaType extends ScaledDecimal {
  override readonly places = 3;
}

/** A length in mm, kept in nanometres. */
export class LengthType extends ScaledDecimal {
  override readonly places = 6;
}

/** A share in per cent, kept in ten-thousandths of a per cent. */
export class PercentType extends ScaledDecimal {
  override readonly places = 4;
}

/** Minutes and hours, kept in hundredths. */
export class TimeType extends ScaledDecimal {
  override readonly places = 2;
}

/** A weight in ounces, kept in thousandths. */
export class OunceType extends ScaledDecimal {
  override readonly places = 3;
}
