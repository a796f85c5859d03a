import { Migration } from '@mikro-orm/migrations';

/** As the check wrote it into the note to the supplier until now. */
const fromCheck = `note LIKE 'For %, packed by %.' AND instr(note, char(10)) = 0`;

/** For which runs an order was drafted is the shop's own business; what a supplier was told already stays told. */
const statements = [
  `ALTER TABLE purchase_order ADD COLUMN drafted_for TEXT NOT NULL DEFAULT ''`,
  `UPDATE purchase_order SET drafted_for = substr(note, 5, length(note) - 5) WHERE ${fromCheck}`,
  `UPDATE purchase_order SET note = '', version = version + 1 WHERE state = 'draft' AND ${fromCheck}`,
];

export class TheDraftedFor extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
