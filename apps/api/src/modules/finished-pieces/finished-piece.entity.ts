import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType } from '../../db/columns/columns.ts';

/** What lies on the shelf of one kind of finished piece: a pattern, its option, good or seconds, whose mark. */
@Entity({ tableName: 'finished_piece' })
export class FinishedPiece {
  [OptionalProps]?: 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  patternId!: number;

  /** Empty for the piece as it is. */
  @Property({ type: 'text', columnType: 'text' })
  optionName!: string;

  @Property({ type: 'text', columnType: 'text' })
  sort!: 'good' | 'seconds';

  /** Whose mark is stamped on them. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  customerId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer' })
  onHand!: number;

  /** What they cost to make: leather and hardware, no wages. */
  @Property({ type: MoneyType })
  value!: Decimal;

  @Property({ type: 'text', columnType: 'text' })
  place!: string;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
