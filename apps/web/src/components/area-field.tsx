import { areaFigure, areaUnits, readArea } from '../lib/units.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import type { FieldLabels } from './field.tsx';
import { MeasureInput } from './measure-input.tsx';
import type { WhenEmpty } from './use-field.ts';

interface AreaFieldProps extends FieldLabels {
  name: string;
  whenEmpty?: WhenEmpty | undefined;
}

/** An area in the shop's unit: 24.75, 24¾ and 24³ are the same. Its value is mm². */
export function AreaField(props: AreaFieldProps) {
  const { areaUnit } = useWorkshop();
  return (
    <MeasureInput
      {...props}
      unit={areaUnits[areaUnit].sign}
      read={(text) => readArea(text, areaUnit)}
      show={(value) => areaFigure(value, areaUnit, 4)}
    />
  );
}
