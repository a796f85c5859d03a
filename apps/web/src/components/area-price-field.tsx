import { priceFromFt2, pricePerFt2 } from '@hidewright/domain';
import { areaUnits, isFigure, type AreaUnit } from '../lib/units.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import type { FieldLabels } from './field.tsx';
import { MeasureInput } from './measure-input.tsx';
import type { WhenEmpty } from './use-field.ts';

type AreaPriceFieldProps = FieldLabels & { name: string; whenEmpty?: WhenEmpty };

/** What an area of leather costs, in the shop's unit. Its value is the price of one ft². */
export function AreaPriceField(props: AreaPriceFieldProps) {
  const { areaUnit, currency } = useWorkshop();
  return (
    <MeasureInput
      {...props}
      unit={`${currency} / ${areaUnits[areaUnit].sign}`}
      read={(text) => readPrice(text.trim(), areaUnit)}
      show={(value) => (areaUnit === 'ft2' ? value : priceFromFt2(value, areaUnit))}
    />
  );
}

/** In ft² it travels and is shown as it was typed, so that too many decimals are named and not rounded. */
function readPrice(text: string, unit: AreaUnit): string | undefined {
  if (!isFigure(text) || text.startsWith('-')) return undefined;
  return unit === 'ft2' ? text : pricePerFt2(text, unit);
}
