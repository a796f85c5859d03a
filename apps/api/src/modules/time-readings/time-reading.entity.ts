import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { TimeType } from '../../db/columns/columns.ts';

/** How long a step of a pattern took once, by a stopwatch; never changed. */
@Entity({ tableName: 'time_reading' })
export class TimeReading {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  patternId!: number;

  @Property({ type: 'text', columnType: 'text' })
  stepName!: string;

  @Property({ type: TimeType })
  seconds!: Decimal;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  personId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  personName!: string;
}
