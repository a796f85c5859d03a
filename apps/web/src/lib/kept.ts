const placeOf = (person: string, key: string): string => `hidewright-kept:${person}:${key}`;

/** What a person left on this device for another day: theirs alone, whoever signs in here meanwhile. */
export function readKept(person: string, key: string): unknown {
  try {
    return JSON.parse(localStorage.getItem(placeOf(person, key)) ?? 'null') ?? undefined;
  } catch {
    return undefined;
  }
}

export function writeKept(person: string, key: string, value: unknown): void {
  try {
    localStorage.setItem(placeOf(person, key), JSON.stringify(value));
  } catch {
    // Storage is full or switched off: it is only not there next time.
  }
}

export function dropKept(person: string, key: string): void {
  try {
    localStorage.removeItem(placeOf(person, key));
  } catch {
    // Nothing was kept.
  }
}
