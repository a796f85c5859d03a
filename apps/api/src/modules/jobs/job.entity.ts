import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { TimeType } from '../../db/columns/columns.ts';
import { JsonText } from '../../db/columns/json-text.ts';

/** The work order at the bench. */
@Entity({ tableName: 'job' })
export class Job {
  [OptionalProps]?: 'good' | 'seconds' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  number!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  orderId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  patternVersionId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  layoutId!: number;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'waiting' | 'ready' | 'at the bench' | 'paused' | 'finished';

  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  cutCount!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  containers!: number;

  @Property({ type: TimeType })
  plannedMinutes!: Decimal;

  /** What the quote said, for the comparison with what was. */
  @Property({ type: JsonText })
  estimate!: unknown;

  @Property({ type: 'integer', columnType: 'integer' })
  good = 0;

  @Property({ type: 'integer', columnType: 'integer' })
  seconds = 0;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  startedAt: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  finishedAt: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
