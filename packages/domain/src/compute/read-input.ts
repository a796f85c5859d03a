import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact } from '../numbers/decimal-text.ts';

/** The fields of a JSON object, read one by one; what is missing or unknown is said in a sentence. */
export class InputReader {
  readonly #fields: Record<string, unknown>;
  readonly #inside: string;

  /** @param inside the field that holds the object, where it is not the whole input */
  constructor(input: unknown, known: readonly string[], inside = '') {
    this.#inside = inside;
    if (typeof input !== 'object' || input === null || Array.isArray(input)) {
      throw new InvalidInput(inside || 'input', `Give one JSON object as ${inside || 'input'}.`);
    }
    this.#fields = { ...input };
    const unknown = Object.keys(this.#fields).find((name) => !known.includes(name));
    if (unknown !== undefined) {
      throw new InvalidInput(
        this.#path(unknown),
        `Leave out ${this.#path(unknown)}: only ${known.join(', ')} ${known.length > 1 ? 'are' : 'is'} understood.`,
      );
    }
  }

  #path(name: string): string {
    return this.#inside ? `${this.#inside}.${name}` : name;
  }

  has(name: string): boolean {
    return this.#fields[name] !== undefined;
  }

  any(name: string): unknown {
    if (!this.has(name)) throw new InvalidInput(this.#path(name), `Give ${this.#path(name)}.`);
    return this.#fields[name];
  }

  number(name: string): number {
    return asNumber(this.any(name), this.#path(name));
  }

  /** A number or a decimal text, as exact text. */
  decimal(name: string): DecimalText {
    return asDecimal(this.any(name), this.#path(name));
  }

  text(name: string): string {
    const value = this.any(name);
    if (typeof value !== 'string' || value.trim() === '') {
      throw new InvalidInput(
        this.#path(name),
        `Give ${this.#path(name)} as text that is not blank.`,
      );
    }
    return value;
  }

  choice<T extends string>(name: string, choices: readonly T[]): T {
    const text = this.text(name);
    const chosen = choices.find((each) => each === text);
    if (chosen === undefined) {
      throw new InvalidInput(
        this.#path(name),
        `Give ${this.#path(name)} as ${choices.join(' or ')}.`,
      );
    }
    return chosen;
  }

  list<T>(name: string, read: (value: unknown, field: string) => T): T[] {
    const value = this.any(name);
    if (!Array.isArray(value) || value.length === 0) {
      throw new InvalidInput(
        this.#path(name),
        `Give ${this.#path(name)} as a list with at least one entry.`,
      );
    }
    return value.map((each: unknown, at) => read(each, `${this.#path(name)}.${at}`));
  }
}

export function asNumber(value: unknown, field: string): number {
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    throw new InvalidInput(field, `Give ${field} as a number.`);
  }
  return value;
}

export function asDecimal(value: unknown, field: string): DecimalText {
  if (typeof value === 'number' && Math.abs(value) <= 1e24) return new Exact(value).toFixed();
  if (typeof value === 'string' && /^-?\d{1,24}(\.\d{1,24})?$/.test(value)) return value;
  throw new InvalidInput(field, `Give ${field} as a number or as a plain decimal text.`);
}
