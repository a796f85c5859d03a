import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { OfferBreak } from '@hidewright/domain';
import { JsonText } from '../../db/columns/json-text.ts';

/** At which prices a supplier sells a leather or a hardware. */
@Entity({ tableName: 'supplier_offer' })
export class SupplierOffer {
  [OptionalProps]?: 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'integer', columnType: 'integer' })
  supplierId!: number;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  leatherId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  hardwareId: number | null = null;

  /** What the supplier calls it. */
  @Property({ type: 'text', columnType: 'text' })
  articleNumber!: string;

  /** Where it takes another time than the supplier usually does. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  leadDays: number | null = null;

  /** Thousandths of mm² of leather, pieces of hardware; null where there is no least. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  minimum: number | null = null;

  /** The same; only multiples of it are sold. */
  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  multiple: number | null = null;

  /** `from` in mm² of leather or pieces of hardware, the price per ft² or piece. */
  @Property({ type: JsonText })
  breaks!: OfferBreak[];

  @Property({ type: 'boolean', columnType: 'integer', runtimeType: 'boolean' })
  preferred!: boolean;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
