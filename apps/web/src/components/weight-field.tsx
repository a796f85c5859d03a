import { Decimal } from 'decimal.js';
import { readWeight } from '../lib/units.ts';
import type { FieldLabels } from './field.tsx';
import { MeasureInput } from './measure-input.tsx';

interface WeightFieldProps extends FieldLabels {
  name: string;
}

/** The weight of leather in ounces, or as a thickness with its unit behind it: 6, 5½ and 2.4 mm. Empty where unknown. */
export function WeightField(props: WeightFieldProps) {
  return (
    <MeasureInput
      {...props}
      optional
      whenEmpty="null"
      unit="oz"
      read={readWeight}
      show={(oz) => new Decimal(oz).toFixed()}
    />
  );
}
