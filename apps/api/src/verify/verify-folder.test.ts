import { cp, mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { knex } from '@mikro-orm/sqlite';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { databaseFile } from '../config.ts';
import { demoFolder } from '../testing/demo-folder.ts';
import { verifyFolder } from './verify-folder.ts';

let folder: string;
let demo: string;

beforeAll(async () => {
  folder = await mkdtemp(path.join(os.tmpdir(), 'hidewright-verify-'));
  demo = (await demoFolder()).dataDir;
}, 300_000);

afterAll(async () => {
  await rm(folder, { recursive: true, force: true });
});

/** Alters a copy as somebody would who goes behind the program's back: its triggers are taken away first. */
async function alteredCopy(sql: string): Promise<string> {
  const copy = await mkdtemp(path.join(folder, 'altered-'));
  await cp(demo, copy, { recursive: true });
  const connection = knex({
    client: 'sqlite3',
    connection: { filename: databaseFile(copy) },
    useNullAsDefault: true,
  });
  const triggers = (await connection.raw(
    `SELECT name FROM sqlite_master WHERE type = 'trigger'`,
  )) as { name: string }[];
  for (const { name } of triggers) await connection.raw(`DROP TRIGGER ${name}`);
  await connection.raw('PRAGMA ignore_check_constraints = ON');
  await connection.raw(sql);
  await connection.destroy();
  return copy;
}

const broken = async (copy: string) =>
  (await verifyFolder(copy)).filter((rule) => rule.faults.length > 0).map((rule) => rule.says);

describe('verifying a data folder', () => {
  it('finds nothing wrong with the demo', async () => {
    expect(await broken(demo)).toEqual([]);
  });

  it.each([
    [
      'stock held for a cancelled order',
      `UPDATE reservation SET open = 1 WHERE id = (SELECT MAX(r.id) FROM reservation r
        JOIN job j ON j.id = r.job_id JOIN customer_order o ON o.id = j.order_id WHERE o.state = 'cancelled')`,
      'A cancelled order holds no stock',
    ],
    [
      'an invoice for a cancelled order',
      `UPDATE invoice SET order_id = (SELECT id FROM customer_order WHERE state = 'cancelled')
        WHERE id = (SELECT MAX(id) FROM invoice)`,
      'A cancelled order has no open invoice',
    ],
    [
      'a reason that an order was cancelled for',
      'DELETE FROM order_cancellation',
      'An order is cancelled exactly where it is written why',
    ],
    [
      'a promised day that was moved',
      `UPDATE promise_move SET to_day = '2027-01-31'`,
      'Each move of a promised day begins where the one before ended, and the last ends on the day promised now',
    ],
    [
      'a part that is a kit',
      'INSERT INTO kit_part (kit_id, hardware_id, quantity) SELECT hardware_id, 1, 1 FROM kit_part LIMIT 1',
      'No part of a kit is a kit',
    ],
    [
      'an offer that asks more for more',
      `UPDATE supplier_offer SET breaks = '[{"from":"1","price":"1"},{"from":"5","price":"2"}]'`,
      'asks no more each for more',
    ],
    [
      'one movement',
      'UPDATE stock_movement SET quantity = quantity + 1 WHERE id = (SELECT MAX(id) FROM stock_movement)',
      'sum of its movements',
    ],
    [
      'a movement deleted',
      'DELETE FROM stock_movement WHERE id = (SELECT MAX(id) FROM stock_movement)',
      'sum of its movements',
    ],
    [
      'one row of the log',
      `UPDATE activity SET actor_name = 'Nobody' WHERE seq = 40`,
      'log of who did what is whole',
    ],
    [
      'a row of the log left out',
      'DELETE FROM activity WHERE seq = 40',
      'log of who did what is whole',
    ],
    [
      'what is on the shelf of finished pieces',
      'UPDATE finished_piece SET on_hand = on_hand + 1',
      'the sum of their ledger',
    ],
    [
      'what an invoice sold from the shelf',
      `UPDATE invoice_line SET quantity = quantity + 1 WHERE id = (SELECT MIN(invoice_line_id) FROM shelf_sale)`,
      'sells from the shelf left it',
    ],
    [
      'a sale from the shelf that was undone by hand',
      `UPDATE shelf_sale SET invoice_line_id = NULL, undone_at = '2026-12-01' WHERE id = 1`,
      'what was undone lies there again',
    ],
    [
      'what a line without an order stands for',
      `DELETE FROM shelf_sale WHERE id = 1`,
      'Every line of an invoice without an order',
    ],
    [
      'what is on hand',
      'UPDATE stock_balance SET on_hand = on_hand + 1 WHERE id = 1',
      'sum of its movements',
    ],
    [
      'what is held',
      'UPDATE stock_balance SET reserved = reserved + 1 WHERE id = 1',
      'what the jobs hold',
    ],
    ['a lot’s cost', 'UPDATE lot SET cost = cost + 1 WHERE id = 1', 'at its cost'],
    [
      'an offcut’s cost',
      'UPDATE lot SET cost = cost - 1 WHERE id = (SELECT MIN(id) FROM lot WHERE parent_id IS NOT NULL)',
      'at its cost',
    ],
    [
      'the lot that an offcut hangs on',
      'UPDATE lot SET parent_id = id + 1 WHERE id = (SELECT MIN(id) FROM lot WHERE parent_id IS NOT NULL)',
      'from the lot that it hangs on',
    ],
    [
      'a job that brought back more than it took',
      `UPDATE stock_movement SET quantity = 99999999999 WHERE from_lot_id IS NOT NULL`,
      'brought back more of a lot than it took',
    ],
    [
      'what came on an order line',
      'UPDATE purchase_line SET received = received - 1 WHERE received > 0',
      'what came on it',
    ],
    [
      'what a delivery cost more than was ordered',
      'UPDATE receipt SET price_difference = price_difference - 1 WHERE id = 1',
      'how much more it cost than at the prices of its order',
    ],
    [
      'what is missing in a delivery',
      'UPDATE receipt SET missing_area_mm2 = 0',
      'is missing of the lots in it',
    ],
    [
      'an answer to a delivery that misses nothing',
      `INSERT INTO delivery_answer (receipt_id, matter, missing_area_mm2, reason, at, actor_name)
        SELECT MIN(id), 'short', 1, '', '2026-12-01', 'Nobody' FROM receipt WHERE missing_area_mm2 = 0`,
      'What is not claimed is what is missing',
    ],
    [
      'what was counted',
      `UPDATE count_line SET counted = counted + 1 WHERE movement_id IS NOT NULL`,
      'posted each of its differences',
    ],
    ['a tool’s wear', `UPDATE tool SET used = used - 1 WHERE used > 0`, 'sum of its ledger'],
    [
      'a price that was quoted',
      'UPDATE quote_break SET price_each = price_each + 100 WHERE id = 3',
      'the price that its numbers say',
    ],
    [
      'a cost that was quoted from',
      `UPDATE quote SET input = json_set(input, '$.leather.pricePerFt2', '1.00') WHERE id = 2`,
      'follow from',
    ],
    [
      'an order’s price',
      'UPDATE customer_order SET price_each = price_each + 1 WHERE id = 1',
      'what its quote offered',
    ],
    [
      'a count at the bench',
      'UPDATE job_step SET good = good + 1 WHERE id = 1',
      'what was logged on it',
    ],
    [
      'minutes in the log of the bench',
      'UPDATE bench_log SET minutes = minutes + 100 WHERE id = 1',
      'what was logged on it',
    ],
    [
      'an invoice’s total',
      'UPDATE invoice SET total = total + 1, net = net + 1 WHERE id = 1',
      'sum of its lines',
    ],
    [
      'an invoice’s line',
      'UPDATE invoice_line SET amount = amount + 1 WHERE id = 1',
      'sum of its lines',
    ],
    [
      'what an invoice said',
      `UPDATE invoice SET snapshot = replace(snapshot, 'Heron', 'Hero') WHERE id = 1`,
      'as it was issued',
    ],
    ['a payment', 'UPDATE payment SET amount = amount - 1 WHERE id = 1', 'Paid, credited and open'],
    ['a posting', 'UPDATE posting SET amount = amount + 1 WHERE id = 1', 'sums to nought'],
    ['a number skipped', 'UPDATE invoice SET sequence = 900 WHERE id = 5', 'without a gap'],
    [
      'a locked period',
      `UPDATE period SET totals = json_set(totals, '$.net', '1.00') WHERE id = 2`,
      'locked at',
    ],
    [
      'the freight of a delivery',
      'UPDATE receipt SET freight = freight + 1 WHERE freight > 0',
      'borne by its lines',
    ],
    [
      'what came with a delivery',
      'UPDATE receipt_line SET goods = goods + 1 WHERE id = 1',
      'stands in the ledger',
    ],
    [
      'a delivery left out',
      'UPDATE purchase_order SET receipts = 0 WHERE id = 1',
      'its deliveries',
    ],
    [
      'a claim',
      'UPDATE supplier_claim SET missing_area_mm2 = missing_area_mm2 + 1',
      'short of their mark',
    ],
    [
      'what a claim is for',
      'UPDATE supplier_claim SET movement_id = 1, receipt_id = NULL, missing_area_mm2 = NULL WHERE id = 1',
      'a return on its own order',
    ],
    [
      'what a claim was credited',
      `UPDATE supplier_claim SET state = 'credited', credited = 100, closed_at = opened_at`,
      'noted of it last',
    ],
    [
      'leather that is out',
      'UPDATE stock_movement SET value = value - 1, quantity = quantity + 1000 WHERE purchase_line_id IS NOT NULL',
      'is out on a sent line',
    ],
    [
      'a line that leather is out on',
      'UPDATE purchase_line SET closed = 1 WHERE service IS NOT NULL',
      'is out on a sent line',
    ],
    [
      'what leather had cost before a service',
      'UPDATE receipt_line SET material = 5 WHERE lot_id IS NOT NULL AND purchase_line_id IS NOT NULL',
      'bears what the leather had cost',
    ],
    [
      'the lot that one hangs on',
      'UPDATE lot SET parent_id = 2 WHERE parent_id IS NULL AND id > 2',
      'hangs on the lot that went out',
    ],
    ['a layout', 'UPDATE layout SET pieces = pieces + 1 WHERE id = 1', 'those that it draws'],
  ])('notices %s that was altered', async (_what, sql, says) => {
    expect(await broken(await alteredCopy(sql))).toEqual(
      expect.arrayContaining([expect.stringContaining(says)]),
    );
  });

  it('notices a kept file that was altered or is gone', async () => {
    const copy = await mkdtemp(path.join(folder, 'altered-'));
    await cp(demo, copy, { recursive: true });
    await rm(path.join(copy, 'files'), { recursive: true });
    expect(await broken(copy)).toEqual([expect.stringContaining('Every kept file')]);
  });
});
