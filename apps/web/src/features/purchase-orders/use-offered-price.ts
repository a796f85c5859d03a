import { useEffect, useRef } from 'react';
import { useFormContext } from 'react-hook-form';
import { priceToFill } from './line-terms.ts';

/** Keeps a price field at what is offered, as long as nobody typed another price. */
export function useOfferedPrice(field: string, offered: string | undefined): void {
  const { getValues, setValue } = useFormContext();
  const before = useRef<string>(undefined);
  useEffect(() => {
    if (offered === undefined) return;
    const typed = String(getValues(field) ?? '');
    const price = priceToFill({ typed, before: before.current, offered });
    before.current = offered;
    if (price !== undefined) setValue(field, price);
  }, [field, offered, getValues, setValue]);
}
