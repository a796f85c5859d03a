import { useEffect, useState } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';
import { dropDraft, readDraft, writeDraft } from '../lib/draft.ts';

/** Keeps what is typed across a reload, until it is sent or thrown away. */
export function useFormDraft<Values extends FieldValues>(
  form: UseFormReturn<Values>,
  key: string | undefined,
) {
  const [restored, setRestored] = useState(false);

  useEffect(() => {
    if (key === undefined) return undefined;
    const draft = readDraft(key);
    if (draft) {
      form.reset({ ...form.getValues(), ...draft }, { keepDefaultValues: true });
      setRestored(true);
    }
    return form.subscribe({
      formState: { values: true, isDirty: true },
      callback: ({ values, isDirty }) => {
        if (isDirty) writeDraft(key, values);
      },
    });
  }, [form, key]);

  return {
    restored,
    forget: () => {
      if (key !== undefined) dropDraft(key);
      setRestored(false);
    },
  };
}
