import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';
import { JsonText } from '../../db/columns/json-text.ts';

/** An invoice; once issued, its number, amounts and snapshot stay as they are. */
@Entity({ tableName: 'invoice' })
export class Invoice {
  [OptionalProps]?: 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  number: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  sequence: number | null = null;

  /** Null where pieces were sold from the shelf. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  orderId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer' })
  customerId!: number;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'draft' | 'issued' | 'part paid' | 'paid' | 'credited';

  @Property({ type: 'text', columnType: 'text', nullable: true })
  issuedOn: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  dueOn: string | null = null;

  @Property({ type: MoneyType })
  net!: Decimal;

  @Property({ type: MoneyType })
  tax!: Decimal;

  @Property({ type: MoneyType })
  total!: Decimal;

  @Property({ type: MoneyType })
  paid!: Decimal;

  @Property({ type: MoneyType })
  credited!: Decimal;

  @Property({ type: JsonText, nullable: true })
  snapshot: unknown | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  snapshotHash: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
