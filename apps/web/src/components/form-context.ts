import { createContext, use } from 'react';

/** The id that the fields of one form begin with, so that the summary of errors can lead to them. */
export const FormIdContext = createContext('form');

export function fieldId(formId: string, name: string): string {
  return `${formId}-${name.replaceAll('.', '-')}`;
}

export function useFieldId(name: string): string {
  return fieldId(use(FormIdContext), name);
}
