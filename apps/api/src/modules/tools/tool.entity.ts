import { Entity, OptionalProps, PrimaryKey, Property } from '@mikro-orm/core';
import type { Decimal } from 'decimal.js';
import { AreaType, LengthType, MoneyType } from '../../db/columns/columns.ts';

/** A cutting die or a stamp plate: what it cost, how much life it has, where it lives. */
@Entity({ tableName: 'tool' })
export class Tool {
  [OptionalProps]?: 'metal' | 'used' | 'slot' | 'ownedBy' | 'piecesPerStrike' | 'version';

  @PrimaryKey({ type: 'integer', columnType: 'integer' })
  id!: number;

  /** As people call it: 7, 41. */
  @Property({ type: 'text', columnType: 'text' })
  number!: string;

  @Property({ type: 'text', columnType: 'text' })
  kind!: 'cutting die' | 'stamp plate';

  @Property({ type: 'text', columnType: 'text' })
  name!: string;

  @Property({ type: 'text', columnType: 'text' })
  metal: '' | 'steel' | 'magnesium' | 'copper' | 'brass' = '';

  @Property({ type: MoneyType })
  cost!: Decimal;

  @Property({ type: 'integer', columnType: 'integer' })
  lifeUses!: number;

  /** Cuts or impressions so far: the sum of its ledger. */
  @Property({ type: 'integer', columnType: 'integer' })
  used = 0;

  @Property({ type: 'text', columnType: 'text' })
  slot = '';

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  patternId: number | null = null;

  @Property({ type: 'integer', columnType: 'integer', nullable: true })
  customerId: number | null = null;

  @Property({ type: 'text', columnType: 'text' })
  ownedBy: 'shop' | 'customer' = 'shop';

  /** Of a customer's own: the last day on which the shop keeps it. */
  @Property({ type: 'text', columnType: 'text', nullable: true })
  keptUntil: string | null = null;

  @Property({ type: 'text', columnType: 'text' })
  state!: 'on the rack' | 'on order' | 'returned' | 'scrapped';

  /** How many pieces a die cuts at once. */
  @Property({ type: 'integer', columnType: 'integer' })
  piecesPerStrike = 1;

  /** Of a die: its rule stands outside the outline by so much. */
  @Property({ type: LengthType, nullable: true })
  ruleThicknessMm: Decimal | null = null;

  /** Of a plate: how far it stands out around the outline. */
  @Property({ type: LengthType, nullable: true })
  borderMm: Decimal | null = null;

  /** Of a plate: what one impression presses into the leather. */
  @Property({ type: AreaType, nullable: true })
  reliefAreaMm2: Decimal | null = null;

  @Property({ type: 'integer', columnType: 'integer', version: true })
  version!: number;
}
