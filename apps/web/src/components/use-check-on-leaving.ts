import type { FocusEvent } from 'react';
import { useFormContext } from 'react-hook-form';

/**
 * Says what is wrong with a field as soon as it is left, for fields that something is worked out from. An empty one
 * is left in peace until the form is sent.
 * @returns for the element around them
 */
export function useCheckOnLeaving(): (event: FocusEvent<HTMLElement>) => void {
  const { trigger, getFieldState } = useFormContext();
  return ({ target }) => {
    if (!(target instanceof HTMLInputElement) || target.name === '') return;
    const { name, value } = target;
    if (value.trim() !== '' || getFieldState(name).invalid) void trigger(name);
  };
}
