import { Entity, PrimaryKey, Property } from '@mikro-orm/core';

/** A row of what is held: signed, so that what a reservation still holds is the sum of its rows. */
@Entity({ tableName: 'reservation_movement' })
export class ReservationMovement {
  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  reservationId!: number;

  @Property({ type: 'text', columnType: 'text' })
  at!: string;

  /** In the shop's time zone. */
  @Property({ type: 'text', columnType: 'text' })
  day!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  quantity!: number;
}
