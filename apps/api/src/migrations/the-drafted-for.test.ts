import { expect, it } from 'vitest';
import { beforeMigrations } from '../testing/before-migrations.ts';

const { run, up } = beforeMigrations();

it('what a draft is for leaves its note to the supplier, and what was sent stays as it was', async () => {
  await up('migration-20261209-the-marks');
  await run(`INSERT INTO supplier (id, name, email, phone, lead_days, note, active)
    VALUES (1, 'Fennbridge Fittings', '', '', 5, '', 1)`);
  const order = (number: string, state: string, note: string) =>
    run(`INSERT INTO purchase_order (number, supplier_id, state, note, created_at)
      VALUES ('${number}', 1, '${state}', '${note}', '2026-12-01T09:00:00.000Z')`);
  const runs = 'Q-0007, packed by Mon 14 Dec 2026; Round coaster, packed by Wed 16 Dec 2026';
  await order('P-0001', 'draft', `For ${runs}.`);
  await order('P-0002', 'sent', `For ${runs}.`);
  await order('P-0003', 'draft', 'For the back door, please.');
  await up();
  expect(await run(`SELECT number, note, drafted_for FROM purchase_order ORDER BY number`)).toEqual(
    [
      { number: 'P-0001', note: '', drafted_for: runs },
      { number: 'P-0002', note: `For ${runs}.`, drafted_for: runs },
      { number: 'P-0003', note: 'For the back door, please.', drafted_for: '' },
    ],
  );
});
