/** A list on this device that outlives the page, and tells whoever shows it of every change. */
export class KeptList<Each> {
  readonly #place: string;
  readonly #listeners = new Set<() => void>();
  #all: readonly Each[];

  /** @param place under which it is kept in the browser's storage */
  constructor(place: string) {
    this.#place = place;
    this.#all = this.#read();
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  readonly all = (): readonly Each[] => this.#all;

  keep(next: readonly Each[]): void {
    this.#all = next;
    try {
      localStorage.setItem(this.#place, JSON.stringify(next));
    } catch {
      // Storage is full or switched off: it is kept as long as this page is open.
    }
    for (const listener of this.#listeners) listener();
  }

  #read(): readonly Each[] {
    try {
      return JSON.parse(localStorage.getItem(this.#place) ?? '[]') as Each[];
    } catch {
      return [];
    }
  }
}
