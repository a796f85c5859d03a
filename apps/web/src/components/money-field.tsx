import { useWorkshop } from '../lib/workshop.tsx';
import { DecimalField } from './decimal-field.tsx';
import type { TextFieldProps } from './text-field.tsx';

interface MoneyFieldProps extends Omit<TextFieldProps, 'type' | 'inputMode' | 'unit'> {
  /** What one price is for: "ft²", "piece", "hour". */
  per?: string | undefined;
}

/** An amount or a unit price in the workshop's currency. */
export function MoneyField({ per, ...props }: MoneyFieldProps) {
  const { currency } = useWorkshop();
  return <DecimalField {...props} unit={per ? `${currency} / ${per}` : currency} />;
}
