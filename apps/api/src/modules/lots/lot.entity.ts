import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import { Decimal } from 'decimal.js';
import {
  AreaType,
  LengthType,
  MoneyType,
  OunceType,
  PercentType,
} from '../../db/columns/columns.ts';
import { JsonText } from '../../db/columns/json-text.ts';

/** One side, hide or bundle of panels on the rack. */
@Entity({ tableName: 'lot' })
export class Lot {
  [OptionalProps]?:
    'pieces' | 'grade' | 'shade' | 'place' | 'supplierLot' | 'usablePercent' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  tag!: string;

  @Property({ type: 'integer', columnType: 'integer' })
  leatherId!: number;

  @Property({ type: 'text', columnType: 'text' })
  form!:
    | 'side'
    | 'hide'
    | 'back'
    | 'bend'
    | 'shoulder'
    | 'double shoulder'
    | 'belly'
    | 'panel'
    | 'strip'
    | 'offcut';

  /** As measured when it came, all panels of the bundle together. */
  @Property({ type: AreaType })
  measuredAreaMm2!: Decimal;

  /** How many panels or strips the bundle held. */
  @Property({ type: 'integer', columnType: 'integer' })
  pieces = 1;

  @Property({ type: LengthType, nullable: true })
  widthMm: Decimal | null = null;

  @Property({ type: LengthType, nullable: true })
  heightMm: Decimal | null = null;

  /** As measured on it; null where nobody did. */
  @Property({ type: OunceType, nullable: true })
  weightOz: Decimal | null = null;

  @Property({ type: MoneyType })
  cost!: Decimal;

  @Property({ type: 'text', columnType: 'text' })
  grade = '';

  @Property({ type: 'text', columnType: 'text' })
  shade = '';

  @Property({ type: 'text', columnType: 'text' })
  place = '';

  @Property({ type: 'text', columnType: 'text' })
  supplierLot = '';

  @Property({ type: 'text', columnType: 'text' })
  receivedOn!: string;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  purchaseLineId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  parentId: number | null = null;

  /** Its edge as drawn, in mm; null where nobody drew it. */
  @Property({ type: JsonText, nullable: true })
  outline: unknown = null;

  /** Closed curves around what is not cut. */
  @Property({ type: JsonText })
  flaws: unknown = [];

  /** The share of its area that can be cut, where its edge is not drawn. */
  @Property({ type: PercentType })
  usablePercent: Decimal = new Decimal(85);

  /** The photo under its drawing. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  photoHash: string | null = null;

  /** Its top left corner in mm, and mm per pixel. */
  @Property({ type: JsonText, nullable: true })
  photoPlace: unknown = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
