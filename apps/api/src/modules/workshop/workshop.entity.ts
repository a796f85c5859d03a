import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { PriceRule } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import {
  LengthType,
  MoneyType,
  PercentType,
  TimeType,
  UnitPriceType,
} from '../../db/columns/columns.ts';
import { JsonText } from '../../db/columns/json-text.ts';

/** The shop itself and its starting values: one row, made when the database is. */
@Entity({ tableName: 'workshop' })
export class Workshop {
  [OptionalProps]?:
    | 'currency'
    | 'areaUnit'
    | 'areaShown'
    | 'lengthUnit'
    | 'timeZone'
    | 'deskMinutesPerOrder'
    | 'quoteValidDays'
    | 'paymentTermDays'
    | 'minimumWagePerHour'
    | 'restPercent'
    | 'overheadPerHour'
    | 'packingPerPiece'
    | 'cardFeePercent'
    | 'cardFeeEach'
    | 'setUpCharge'
    | 'minimumOrder'
    | 'priceRule'
    | 'stockValue'
    | 'stockValueAfter'
    | 'address'
    | 'taxNumber'
    | 'areaTolerancePercent'
    | 'servicePercent'
    | 'orderCost'
    | 'holdingPercent'
    | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  @Property({ type: 'text', columnType: 'text' })
  mode!: 'demo' | 'shop';

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  currency = 'USD';

  @Property({ type: 'text', columnType: 'text' })
  areaUnit: 'ft2' | 'dm2' | 'm2' = 'ft2';

  /** How finely the area of a lot is said: the two habits of the trade. */
  @Property({ type: 'text', columnType: 'text' })
  areaShown: 'tenth' | 'quarter' = 'tenth';

  @Property({ type: 'text', columnType: 'text' })
  lengthUnit: 'mm' | 'in' = 'mm';

  @Property({ type: 'text', columnType: 'text' })
  timeZone = 'UTC';

  /** What a bench hour should leave, before wages. */
  @Property({ type: MoneyType, columnType: 'integer' })
  targetPerHour!: Decimal;

  @Property({ type: MoneyType, columnType: 'integer' })
  wagePerHour!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  deskMinutesPerOrder = 45;

  @Property({ type: MoneyType, columnType: 'integer' })
  packingPerOrder!: Decimal;

  @Property({ type: PercentType, columnType: 'integer' })
  rejectPercent!: Decimal;

  /** How sure a cut count must be that enough good pieces remain. */
  @Property({ type: PercentType, columnType: 'integer' })
  confidencePercent!: Decimal;

  @Property({ type: MoneyType, columnType: 'integer' })
  priceStep!: Decimal;

  @Property({ type: TimeType, columnType: 'integer' })
  benchHoursPerDay!: Decimal;

  @Property({ type: LengthType, columnType: 'integer' })
  spacingMm!: Decimal;

  @Property({ type: LengthType, columnType: 'integer' })
  trimMm!: Decimal;

  @Property({ type: PercentType, columnType: 'integer' })
  depositPercent!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  quoteValidDays = 30;

  @Property({ type: 'integer', columnType: 'integer' })
  paymentTermDays = 30;

  /** Least that may be paid for an hour; nought where nobody said. */
  @Property({ type: MoneyType, columnType: 'integer' })
  minimumWagePerHour: Decimal = new Decimal(0);

  /** On top of all bench time, for rest. */
  @Property({ type: PercentType, columnType: 'integer' })
  restPercent: Decimal = new Decimal(0);

  /** Rent, light, insurance, for each bench hour. */
  @Property({ type: MoneyType, columnType: 'integer' })
  overheadPerHour: Decimal = new Decimal(0);

  @Property({ type: UnitPriceType, columnType: 'integer' })
  packingPerPiece: Decimal = new Decimal(0);

  @Property({ type: PercentType, columnType: 'integer' })
  cardFeePercent: Decimal = new Decimal(0);

  @Property({ type: MoneyType, columnType: 'integer' })
  cardFeeEach: Decimal = new Decimal(0);

  @Property({ type: MoneyType, columnType: 'integer' })
  setUpCharge: Decimal = new Decimal(0);

  @Property({ type: MoneyType, columnType: 'integer' })
  minimumOrder: Decimal = new Decimal(0);

  /** How a price that nobody typed is worked out. */
  @Property({ type: JsonText, columnType: 'text' })
  priceRule: PriceRule = { kind: 'target' };

  /** How hardware and supplies are valued; a lot always stands at its own cost. */
  @Property({ type: 'text', columnType: 'text' })
  stockValue: 'moving average' | 'first in first out' = 'moving average';

  /** The ledger's last row when that was chosen: what was there then is the oldest layer. */
  @Property({ type: 'integer', columnType: 'integer' })
  stockValueAfter = 0;

  @Property({ type: 'text', columnType: 'text' })
  address = '';

  @Property({ type: 'text', columnType: 'text' })
  taxNumber = '';

  /** How far a side may miss the area marked on it. */
  @Property({ type: PercentType, columnType: 'integer' })
  areaTolerancePercent: Decimal = new Decimal(3);

  /** How sure stock should last until a delivery comes. */
  @Property({ type: PercentType, columnType: 'integer' })
  servicePercent: Decimal = new Decimal(95);

  /** Of placing one order with a supplier. */
  @Property({ type: MoneyType, columnType: 'integer' })
  orderCost: Decimal = new Decimal(10);

  /** Keeping a thing for a year costs this share of its price. */
  @Property({ type: PercentType, columnType: 'integer' })
  holdingPercent: Decimal = new Decimal(20);

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
