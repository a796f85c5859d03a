import { Migration } from '@mikro-orm/migrations';

const columns: [string, string[]][] = [
  [
    'leather',
    [
      `reorder_at_mm2 INTEGER CHECK (reorder_at_mm2 > 0)`,
      `order_point_mm2 INTEGER CHECK (order_point_mm2 >= 0)`,
      `order_quantity_mm2 INTEGER CHECK (order_quantity_mm2 > 0)`,
    ],
  ],
  [
    'hardware',
    [
      `order_point INTEGER CHECK (order_point >= 0)`,
      `order_quantity INTEGER CHECK (order_quantity > 0)`,
    ],
  ],
  [
    'workshop',
    [
      `service_percent INTEGER NOT NULL DEFAULT 950000 CHECK (service_percent BETWEEN 500000 AND 999999)`,
      `order_cost INTEGER NOT NULL DEFAULT 1000 CHECK (order_cost > 0)`,
      `holding_percent INTEGER NOT NULL DEFAULT 200000 CHECK (holding_percent BETWEEN 1 AND 1000000)`,
    ],
  ],
];

/** When and how much of a thing is ordered: a least of leather, what the owner sets, and what orders and keeping cost. */
export class TheOrdersDue extends Migration {
  override up(): void {
    for (const [table, added] of columns) {
      for (const column of added) this.addSql(`ALTER TABLE ${table} ADD COLUMN ${column}`);
    }
  }
}
