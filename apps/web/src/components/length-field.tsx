import { lengthFigure, lengthUnits, readLength, type LengthUnit } from '../lib/units.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import type { FieldLabels } from './field.tsx';
import { MeasureInput } from './measure-input.tsx';
import type { WhenEmpty } from './use-field.ts';

interface LengthFieldProps extends FieldLabels {
  name: string;
  whenEmpty?: WhenEmpty | undefined;
  /** Another unit than the shop's, where the trade has one. */
  unit?: LengthUnit | undefined;
}

/** A length in the shop's unit: 5.5, 5½ and 5 1/2 are the same. Its value is mm. */
export function LengthField({ unit, ...props }: LengthFieldProps) {
  const { lengthUnit } = useWorkshop();
  const used = unit ?? lengthUnit;
  return (
    <MeasureInput
      {...props}
      unit={lengthUnits[used].sign}
      read={(text) => readLength(text, used)}
      show={(value) => lengthFigure(value, used, 6)}
    />
  );
}
