import { Migration } from '@mikro-orm/migrations';

const columns = [
  `photo_hash TEXT REFERENCES stored_file (hash)`,
  `photo_place TEXT CHECK (photo_place IS NULL OR (json_valid(photo_place) AND photo_hash IS NOT NULL))`,
];

/** The photo that lies under a lot's drawing, and where. */
export class ThePhotos extends Migration {
  override up(): void {
    for (const column of columns) this.addSql(`ALTER TABLE lot ADD COLUMN ${column}`);
  }
}
