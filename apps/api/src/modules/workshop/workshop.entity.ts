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
  @Property({ type: MoneyType })
  targetPerHour!: Decimal;

  @Property({ type: MoneyType })
  wagePerHour!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  deskMinutesPerOrder = 45;

  @Property({ type: MoneyType })
  packingPerOrder!: Decimal;

  @Property({ type: PercentType })
  rejectPercent!: Decimal;

  /** How sure a cut count must be that enough good pieces remain. */
  @Property({ type: PercentType })
  confidencePercent!: Decimal;

  @Property({ type: MoneyType })
  priceStep!: Decimal;

  @Property({ type: TimeType })
  benchHoursPerDay!: Decimal;

  @Property({ type: LengthType })
  spacingMm!: Decimal;

  @Property({ type: LengthType })
  trimMm!: Decimal;

  @Property({ type: PercentType })
  depositPercent!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  quoteValidDays = 30;

  @Property({ type: 'integer', columnType: 'integer' })
  paymentTermDays = 30;

  /** Least that may be paid for an hour; nought where nobody said. */
  @Property({ type: MoneyType })
  minimumWagePerHour: Decimal = new Decimal(0);

  /** On top of all bench time, for rest. */
  @Property({ type: PercentType })
  restPercent: Decimal = new Decimal(0);

  /** Rent, light, insurance, for each bench hour. */
  @Property({ type: MoneyType })
  overheadPerHour: Decimal = new Decimal(0);

  @Property({ type: UnitPriceType })
  packingPerPiece: Decimal = new Decimal(0);

  @Property({ type: PercentType })
  cardFeePercent: Decimal = new Decimal(0);

  @Property({ type: MoneyType })
  cardFeeEach: Decimal = new Decimal(0);

  @Property({ type: MoneyType })
  setUpCharge: Decimal = new Decimal(0);

  @Property({ type: MoneyType })
  minimumOrder: Decimal = new Decimal(0);

  /** How a price that nobody typed is worked out. */
  @Property({ type: JsonText })
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
  @Property({ type: PercentType })
  areaTolerancePercent: Decimal = new Decimal(3);

  /** How sure stock should last until a delivery comes. */
  @Property({ type: PercentType })
  servicePercent: Decimal = new Decimal(95);

  /** Of placing one order with a supplier. */
  @Property({ type: MoneyType })
  orderCost: Decimal = new Decimal(10);

  /** Keeping a thing for a year costs this share of its price. */
  @Property({ type: PercentType })
  holdingPercent: Decimal = new Decimal(20);

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;

  @Property({ type: 'text', columnType: 'text' })
  createdAt!: string;
}
