import { createRequire } from 'node:module';

/**
 * A defect to be noticed: what is free is looked up first and held afterwards, with others at work in between. The
 * look goes to a connection of its own, as it was before anybody of this moment had begun, and is remembered for as
 * long as a busy server takes to come to the holding.
 */
const require = createRequire(new URL('../../../apps/api/package.json', import.meta.url));
const { SqlEntityManager } = require('@mikro-orm/sqlite');
const findOne = SqlEntityManager.prototype.findOne;
const seen = new Map();

SqlEntityManager.prototype.findOne = async function findEarlier(entity, where, ...rest) {
  const row = await findOne.call(this, entity, where, ...rest);
  if ((entity.name ?? entity) !== 'StockBalance' || row === null) return row;
  const key = JSON.stringify(where);
  const before = seen.get(key);
  if (before !== undefined && Date.now() - before.at < 2000) row.reserved = before.reserved;
  else seen.set(key, { at: Date.now(), reserved: row.reserved });
  return row;
};
