import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';

/** Once another way is chosen, what was wrong with the fields of the one before says nothing any more. */
export function useFreshErrors(group: string, choice: string): string {
  const { clearErrors } = useFormContext();
  const chosen = String(useWatch({ name: `${group}.${choice}` }));
  useEffect(() => clearErrors(group), [clearErrors, group, chosen]);
  return chosen;
}
