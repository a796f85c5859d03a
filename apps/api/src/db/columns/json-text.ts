import { Type } from '@mikro-orm/core';

/**
 * A snapshot kept as JSON text: STRICT tables know no JSON type. A value is replaced, never changed in place: the
 * text of each is kept beside it, so that a flush does not write out every snapshot at hand again to compare it.
 */
export class JsonText extends Type<unknown, string | null> {
  override get runtimeType(): string {
    return 'unknown';
  }

  override convertToDatabaseValue(value: unknown): string | null {
    if (value === null || value === undefined) return null;
    if (typeof value !== 'object') return JSON.stringify(value);
    const known = texts.get(value);
    if (known !== undefined) return known;
    const text = JSON.stringify(value);
    texts.set(value, text);
    return text;
  }

  override convertToJSValue(value: unknown): unknown {
    if (typeof value !== 'string') return value;
    const read = JSON.parse(value) as unknown;
    if (typeof read === 'object' && read !== null) texts.set(read, value);
    return read;
  }

  override compareAsType(): string {
    return 'string';
  }

  override ensureComparable(): boolean {
    return true;
  }

  override getColumnType(): string {
    return 'text';
  }
}

/** The text of each value that was read or written. */
const texts = new WeakMap<object, string>();
