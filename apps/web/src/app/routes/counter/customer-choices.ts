import type { Customer } from '@hidewright/contract';

/** Whom a quote can be for, by name. */
export function customerChoices(
  customers: readonly Customer[],
): { value: number; label: string }[] {
  return customers
    .filter((customer) => customer.active)
    .map(({ id, name }) => ({ value: id, label: name }))
    .sort((a, b) => a.label.localeCompare(b.label));
}
