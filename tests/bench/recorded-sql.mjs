import { appendFileSync } from 'node:fs';
import { createRequire } from 'node:module';

/** Writes down every statement that the program sends to SQLite, with its parameters, as lines of JSON. */
const file = process.env.RECORDED_SQL;
const api = createRequire(new URL('../../apps/api/package.json', import.meta.url));
const driver = createRequire(
  createRequire(api.resolve('@mikro-orm/sqlite')).resolve('@mikro-orm/knex'),
);
const { Database } = driver('sqlite3');

for (const method of ['all', 'run', 'get', 'each']) {
  const original = Database.prototype[method];
  Database.prototype[method] = function record(sql, ...rest) {
    const params = Array.isArray(rest[0]) ? rest[0] : [];
    appendFileSync(file, `${JSON.stringify({ sql, params })}\n`);
    return original.call(this, sql, ...rest);
  };
}
