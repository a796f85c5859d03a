import { areaExamples, areaFigure, areaUnits, readArea } from '../lib/units.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import type { FieldLabels } from './field.tsx';
import { MeasureInput } from './measure-input.tsx';
import type { WhenEmpty } from './use-field.ts';

interface AreaFieldProps extends Omit<FieldLabels, 'help'> {
  name: string;
  /** What helps, or how it is said with the ways in which an area may be typed. */
  help?: string | ((examples: string) => string) | undefined;
  whenEmpty?: WhenEmpty | undefined;
}

/** An area in the shop's unit: in ft² 24.75, 24¾, 24³ and 24/3 are the same. Its value is mm². */
export function AreaField({ help, ...props }: AreaFieldProps) {
  const { areaUnit } = useWorkshop();
  return (
    <MeasureInput
      {...props}
      help={typeof help === 'function' ? help(areaExamples[areaUnit]) : help}
      unit={areaUnits[areaUnit].sign}
      read={(text) => readArea(text, areaUnit)}
      show={(value) => areaFigure(value, areaUnit, 4)}
    />
  );
}
