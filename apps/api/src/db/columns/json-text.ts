import { Type } from '@mikro-orm/core';

/** A snapshot kept as JSON text: STRICT tables know no JSON type. */
export class JsonText extends Type<unknown, string | null> {
  override convertToDatabaseValue(value: unknown): string | null {
    if (value === null || value === undefined) return null;
    return JSON.stringify(value);
  }

  override convertToJSValue(value: unknown): unknown {
    return typeof value === 'string' ? (JSON.parse(value) as unknown) : value;
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
