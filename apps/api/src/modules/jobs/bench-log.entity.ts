import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { MoneyType, TimeType } from '../../db/columns/columns.ts';

/** What a maker logged on a step; never changed, a slip is put right by a further row. */
@Entity({ tableName: 'bench_log' })
export class BenchLog {
  [OptionalProps]?: 'note' | 'wagePerHour';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  jobStepId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  good!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  rejects!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  seconds!: number;

  @Property({ type: TimeType })
  minutes!: Decimal;

  /** What an hour of whoever logged it was paid then; null where it was the wage of the estimate. */
  @Property({ type: MoneyType, nullable: true })
  wagePerHour: Decimal | null = null;

  @Property({ type: 'text', columnType: 'text' })
  note = '';

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  @Property({ type: 'text', columnType: 'text' })
  day!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  personId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  personName!: string;
}
