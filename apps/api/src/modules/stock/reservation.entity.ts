import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** Stock held for a job, less what the job has taken. */
@Entity({ tableName: 'reservation' })
export class Reservation {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  jobId!: number;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  lotId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  hardwareId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;

  /** What is still held of it. */
  @Property({ type: 'integer', columnType: 'integer' })
  open!: number;
}
