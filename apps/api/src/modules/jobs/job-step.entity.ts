import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { PercentType, TimeType } from '../../db/columns/columns.ts';

/** One step of a job, with the sums of what was logged on it. */
@Entity({ tableName: 'job_step' })
export class JobStep {
  [OptionalProps]?: 'good' | 'rejects' | 'seconds';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  jobId!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  position!: number;

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  per!: 'piece' | 'strike' | 'panel' | 'strip' | 'run';

  @Property({ type: TimeType })
  setupMinutes!: Decimal;

  @Property({ type: TimeType })
  secondsPerUnit!: Decimal;

  @Property({ type: PercentType })
  rejectPercent!: Decimal;

  @Property({ type: TimeType })
  plannedMinutes!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  good = 0;

  @Property({ type: 'integer', columnType: 'integer' })
  rejects = 0;

  @Property({ type: 'integer', columnType: 'integer' })
  seconds = 0;

  @Property({ type: TimeType })
  minutes!: Decimal;
}
