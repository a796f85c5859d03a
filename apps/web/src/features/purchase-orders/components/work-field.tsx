import { useState, type ChangeEvent } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { describedBy, Field } from '../../../components/field.tsx';
import { SelectInput } from '../../../components/select-input.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useField } from '../../../components/use-field.ts';

const works = ['dyeing', 'skiving', 'splitting'] as const;
const isUsual = (word: string) => works.some((work) => work === word);

/** Which work a lot goes out for: one of the usual ones, or a word of the shop's own. */
export function WorkField({ name }: { name: string }) {
  const { setValue } = useFormContext();
  const { id, register, error } = useField(name);
  const word = (useWatch({ name }) ?? '') as string;
  const [own, setOwn] = useState(word !== '' && !isUsual(word));

  function choose({ target: { value } }: ChangeEvent<HTMLSelectElement>) {
    setOwn(value === 'own');
    setValue(name, value === 'own' ? '' : value, { shouldDirty: true });
  }

  // The form's own field is the list, or the text beside it.
  const listId = own ? `${id}-list` : id;
  const listError = own ? undefined : error;
  return (
    <>
      <Field id={listId} label="Work" error={listError}>
        <SelectInput
          key={String(own)}
          {...(own ? { value: 'own', onChange: choose } : register(name, { onChange: choose }))}
          id={listId}
          invalid={listError !== undefined}
          aria-describedby={describedBy(listId, { error: listError })}
        >
          <option value="">Choose the work</option>
          {works.map((work) => (
            <option key={work} value={work} className="bg-card text-ink">
              {work}
            </option>
          ))}
          <option value="own">other work</option>
        </SelectInput>
      </Field>
      {own && <TextField name={name} label="Which work" help="Such as embossing." />}
    </>
  );
}
