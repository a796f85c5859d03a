import { createRequire } from 'node:module';

/** A defect to be noticed: the program answers while its commit is still to come. */
const require = createRequire(new URL('../../../apps/api/package.json', import.meta.url));
const { AbstractSqlConnection } = require('@mikro-orm/sqlite');
const commit = AbstractSqlConnection.prototype.commit;

AbstractSqlConnection.prototype.commit = function commitLater(...args) {
  setTimeout(() => void commit.apply(this, args), 300);
  return Promise.resolve();
};
