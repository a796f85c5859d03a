import { Migration } from '@mikro-orm/migrations';

const column = `ALTER TABLE lot ADD COLUMN weight_oz INTEGER CHECK (weight_oz > 0)`;

/** What a lot itself weighs, in thousandths of an ounce; unknown of all that came before. */
export class TheWeights extends Migration {
  override up(): void {
    this.addSql(column);
  }
}
