import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { SelectField } from '../../../components/select-field.tsx';
import { patternOptionsQuery } from '../finished-pieces.queries.ts';

/** Which option of the chosen pattern, where it has any; another pattern's is let go. */
export function OptionField() {
  const patternId = Number(useWatch({ name: 'patternId' }) ?? 0);
  const { getValues, setValue } = useFormContext();
  const { data: options } = useQuery(patternOptionsQuery(patternId));
  useEffect(() => {
    const chosen: unknown = getValues('option');
    if (options && chosen && !options.some((option) => option === chosen)) setValue('option', null);
  }, [options, getValues, setValue]);
  if (options === undefined || options.length === 0) return null;
  return (
    <SelectField
      name="option"
      label="Option"
      placeholder="as it is"
      whenEmpty="null"
      choices={options.map((option) => ({ value: option, label: option }))}
    />
  );
}
