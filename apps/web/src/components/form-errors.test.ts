import { describe, expect, it } from 'vitest';
import { formField, listErrors } from './form-errors.ts';

describe('the errors of a form', () => {
  it('lists them in the order of the fields, however deep', () => {
    const errors = {
      name: { type: 'custom', message: 'Enter a name.' },
      steps: [undefined, { minutes: { type: 'custom', message: 'Enter minutes.' } }],
    };
    expect(listErrors(errors as never)).toEqual([
      { field: 'name', message: 'Enter a name.' },
      { field: 'steps.1.minutes', message: 'Enter minutes.' },
    ]);
  });

  it.each([
    ['name', 'name'],
    ['/steps/0/minutes', 'steps.0.minutes'],
    ['body.name', 'name'],
  ])('finds the field that the API calls %s', (field, name) => {
    expect(formField(field)).toBe(name);
  });
});
