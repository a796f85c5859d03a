import { Migration } from '@mikro-orm/migrations';

const columns: [string, string[]][] = [
  [
    'workshop',
    [
      `minimum_wage_per_hour INTEGER NOT NULL DEFAULT 0 CHECK (minimum_wage_per_hour >= 0)`,
      `rest_percent INTEGER NOT NULL DEFAULT 0 CHECK (rest_percent BETWEEN 0 AND 1000000)`,
      `overhead_per_hour INTEGER NOT NULL DEFAULT 0 CHECK (overhead_per_hour >= 0)`,
      `packing_per_piece INTEGER NOT NULL DEFAULT 0 CHECK (packing_per_piece >= 0)`,
      `card_fee_percent INTEGER NOT NULL DEFAULT 0 CHECK (card_fee_percent BETWEEN 0 AND 500000)`,
      `card_fee_each INTEGER NOT NULL DEFAULT 0 CHECK (card_fee_each >= 0)`,
      `set_up_charge INTEGER NOT NULL DEFAULT 0 CHECK (set_up_charge >= 0)`,
      `minimum_order INTEGER NOT NULL DEFAULT 0 CHECK (minimum_order >= 0)`,
      `price_rule TEXT NOT NULL DEFAULT '{"kind":"target"}' CHECK (json_valid(price_rule))`,
    ],
  ],
  [
    'leather',
    [
      `whole_form TEXT CHECK (length(whole_form) BETWEEN 1 AND 20)`,
      `whole_area_mm2 INTEGER CHECK (whole_area_mm2 > 0)`,
      `whole_usable_percent INTEGER NOT NULL DEFAULT 850000 CHECK (whole_usable_percent BETWEEN 10000 AND 1000000)`,
    ],
  ],
  [
    'quote',
    [
      `terms TEXT NOT NULL DEFAULT '{}' CHECK (json_valid(terms))`,
      `agreed_option TEXT CHECK (length(agreed_option) BETWEEN 1 AND 60)`,
    ],
  ],
  [
    'customer_order',
    [
      `option_name TEXT CHECK (length(option_name) BETWEEN 1 AND 60)`,
      `charges TEXT NOT NULL DEFAULT '[]' CHECK (json_valid(charges))`,
    ],
  ],
];

/** What a run's numbers rest on beside leather, hardware and minutes: the shop's own rates, terms and options. */
export class TheWorkings extends Migration {
  override up(): void {
    for (const [table, added] of columns) {
      for (const column of added) this.addSql(`ALTER TABLE ${table} ADD COLUMN ${column}`);
    }
  }
}
