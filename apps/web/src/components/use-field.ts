import { get, useFormContext, useFormState } from 'react-hook-form';
import { useFieldId } from './form-context.ts';

/** What each field needs to know of the form it stands in. */
export function useField(name: string) {
  const { register, control } = useFormContext();
  const { errors } = useFormState({ control, name });
  const found: unknown = get(errors, `${name}.message`);
  const error = typeof found === 'string' ? found : undefined;
  return { id: useFieldId(name), register, control, error };
}

/** What an empty field means to the contract: an empty text, nothing at all, or null. */
export type WhenEmpty = 'text' | 'absent' | 'null';

export function emptied(whenEmpty: WhenEmpty): '' | undefined | null {
  if (whenEmpty === 'text') return '';
  return whenEmpty === 'null' ? null : undefined;
}
