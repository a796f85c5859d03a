import { expect, it } from 'vitest';
import { beforeMigrations } from '../testing/before-migrations.ts';

const { run, up } = beforeMigrations();

it('a rack and its ledger from before come through, and what points at a tool still does', async () => {
  await up('migration-20261201-the-sides');
  await run(`INSERT INTO tool (number, kind, name, metal, cost, life_uses, used, slot, state, border_mm)
    VALUES ('41', 'stamp plate', 'Heron', 'brass', 9000, 100000, 70, 'C1', 'on the rack', 1500000),
      ('42', 'stamp plate', 'Oars', 'copper', 8000, 100000, 0, '', 'scrapped', NULL)`);
  await run(`INSERT INTO impression (tool_id, uses, at, reason, actor_name)
    VALUES (1, 70, '2026-11-30T09:00:00.000Z', 'a trial', 'The owner')`);
  await up();
  expect(
    await run(
      `SELECT id, number, used, state, border_mm, owned_by, kept_until FROM tool ORDER BY id`,
    ),
  ).toEqual([
    expect.objectContaining({
      id: 1,
      number: '41',
      used: 70,
      border_mm: 1500000,
      owned_by: 'shop',
    }),
    expect.objectContaining({ id: 2, state: 'scrapped', kept_until: null }),
  ]);
  expect(await run(`PRAGMA foreign_key_check`)).toEqual([]);
  expect(await run(`PRAGMA foreign_keys`)).toEqual([{ foreign_keys: 1 }]);
  const wrong = `INSERT INTO impression (tool_id, uses, at, reason, actor_name) VALUES (9, 1, '', '', '')`;
  await expect(run(wrong)).rejects.toThrow('FOREIGN KEY');
  await expect(run(`UPDATE tool SET state = 'returned' WHERE id = 1`)).rejects.toThrow('CHECK');
});
