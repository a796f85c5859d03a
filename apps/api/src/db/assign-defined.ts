/** Sets the fields that a partial change names; a field left out of the request stays as it is. */
export function assignDefined<T extends object>(
  target: T,
  changes: { [K in keyof T]?: T[K] | undefined },
): void {
  for (const [name, value] of Object.entries(changes)) {
    if (value !== undefined) Object.assign(target, { [name]: value });
  }
}
