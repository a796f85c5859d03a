import type { FieldErrors } from 'react-hook-form';
import type { FieldError } from '../lib/api-problem.ts';

/** The errors of a form, nested as its fields are, as one list in the order of the fields. */
export function listErrors(errors: FieldErrors, path = ''): FieldError[] {
  return Object.entries(errors).flatMap(([name, error]): FieldError[] => {
    if (!error || typeof error !== 'object' || name === 'ref') return [];
    const field = path === '' ? name : `${path}.${name}`;
    if (typeof error.message === 'string' && error.message !== '')
      return [{ field, message: error.message }];
    return listErrors(error as FieldErrors, field);
  });
}

/** The API names fields as `steps.0.minutes`, `/steps/0/minutes` or with `body.` before it. */
export function formField(field: string): string {
  return field
    .replace(/^\//, '')
    .replaceAll('/', '.')
    .replace(/^body\./, '');
}
