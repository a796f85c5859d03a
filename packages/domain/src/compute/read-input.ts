import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact } from '../numbers/decimal-text.ts';

/** The fields of a JSON object, read one by one; what is missing or unknown is said in a sentence. */
export class InputReader {
  readonly #fields: Record<string, unknown>;

  constructor(input: unknown, known: readonly string[]) {
    if (typeof input !== 'object' || input === null || Array.isArray(input)) {
      throw new InvalidInput('input', 'Give one JSON object as input.');
    }
    this.#fields = { ...input };
    const unknown = Object.keys(this.#fields).find((name) => !known.includes(name));
    if (unknown !== undefined) {
      throw new InvalidInput(
        unknown,
        `Leave out ${unknown}: only ${known.join(', ')} are understood.`,
      );
    }
  }

  has(name: string): boolean {
    return this.#fields[name] !== undefined;
  }

  any(name: string): unknown {
    if (!this.has(name)) throw new InvalidInput(name, `Give ${name}.`);
    return this.#fields[name];
  }

  number(name: string): number {
    return asNumber(this.any(name), name);
  }

  /** A number or a decimal text, as exact text. */
  decimal(name: string): DecimalText {
    return asDecimal(this.any(name), name);
  }

  text(name: string): string {
    const value = this.any(name);
    if (typeof value !== 'string') throw new InvalidInput(name, `Give ${name} as text.`);
    return value;
  }

  list<T>(name: string, read: (value: unknown, field: string) => T): T[] {
    const value = this.any(name);
    if (!Array.isArray(value) || value.length === 0) {
      throw new InvalidInput(name, `Give ${name} as a list with at least one entry.`);
    }
    return value.map((each: unknown, at) => read(each, `${name}.${at}`));
  }
}

export function asNumber(value: unknown, field: string): number {
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    throw new InvalidInput(field, `Give ${field} as a number.`);
  }
  return value;
}

export function asDecimal(value: unknown, field: string): DecimalText {
  if (typeof value === 'number' && Number.isFinite(value)) return new Exact(value).toFixed();
  if (typeof value === 'string' && /^-?\d{1,24}(\.\d{1,24})?$/.test(value)) return value;
  throw new InvalidInput(field, `Give ${field} as a number or as a plain decimal text.`);
}
