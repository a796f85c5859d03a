const prefix = 'hidewright-draft:';

/** What was typed into a form and not yet sent: kept for this tab, so that a reload loses nothing. */
export function readDraft(key: string): Record<string, unknown> | undefined {
  try {
    const text = sessionStorage.getItem(prefix + key);
    return text === null ? undefined : (JSON.parse(text) as Record<string, unknown>);
  } catch {
    return undefined;
  }
}

/** What was typed belongs to what the address began the form with: the item, the order, the customer. */
export function draftKeyAt(form: string, search: URLSearchParams): string {
  const asked = new URLSearchParams(search);
  asked.sort();
  return asked.size === 0 ? form : `${form}-${asked}`;
}

export function writeDraft(key: string, values: unknown): void {
  try {
    sessionStorage.setItem(prefix + key, JSON.stringify(values));
  } catch {
    // Storage is full or switched off: the form still works, it only forgets on a reload.
  }
}

export function dropDraft(key: string): void {
  try {
    sessionStorage.removeItem(prefix + key);
  } catch {
    // Nothing was kept.
  }
}

/** Another person signs in at the same screen: nothing of the last one's typing may show. */
export function dropAllDrafts(): void {
  try {
    for (const key of Object.keys(sessionStorage)) {
      if (key.startsWith(prefix)) sessionStorage.removeItem(key);
    }
  } catch {
    // Nothing was kept.
  }
}
