import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';

/** A sheet on which a place, a leather, or hardware and supplies are counted. */
@Entity({ tableName: 'stock_count' })
export class StockCount {
  [OptionalProps]?: 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'open' | 'handed in' | 'approved' | 'cancelled';

  @Property({ type: 'text', columnType: 'text' })
  title!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  place: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  leatherId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  openedAt!: string;

  @Property({ type: 'text', columnType: 'text' })
  openedByName!: string;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  handedInAt: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  handedInByName: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  settledAt: string | null = null;

  @Property({ type: 'text', columnType: 'text', nullable: true })
  settledByName: string | null = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
