import { createHash } from 'node:crypto';
import { isDeepStrictEqual } from 'node:util';
import { invoiceTotals } from '@hidewright/domain';
import { readSalesSheet } from '../modules/periods/sales-sheet.ts';
import { none, type Query, type Rule } from './rule.ts';

interface InvoiceRow {
  id: number;
  number: string | null;
  net: number;
  tax: number;
  total: number;
  snapshot: string | null;
  snapshot_hash: string | null;
}

interface LineRow {
  invoice_id: number;
  quantity: number;
  unit_price: number;
  amount: number;
  tax_rate_id: number | null;
  tax_percent: number;
}

const nameOf = (invoice: InvoiceRow) => invoice.number ?? 'a draft invoice';

export const bookRules: Rule[] = [
  {
    says: 'An invoice’s total is the sum of its lines and their tax, to the cent',
    find: async ({ query }) => {
      const lines = await query<LineRow>('SELECT * FROM invoice_line');
      const invoices = await query<InvoiceRow>('SELECT * FROM invoice');
      return invoices
        .filter((invoice) => !addsUp(invoice, lines))
        .map((invoice) => `${nameOf(invoice)} does not add up`);
    },
  },
  none(
    'An invoice’s tax by rate sums to its tax',
    `SELECT COALESCE(i.number, 'a draft invoice') || ' has other tax by rate' AS fault FROM invoice i
    WHERE i.tax <> (SELECT COALESCE(SUM(tax), 0) FROM invoice_tax WHERE invoice_id = i.id)`,
  ),
  none(
    'Paid, credited and open make up each invoice’s total, and its state says so',
    `SELECT COALESCE(i.number, 'a draft invoice') || ' says ' || i.paid || ' paid, its payments sum to ' || got AS fault
    FROM (SELECT i.*, (SELECT COALESCE(SUM(amount), 0) FROM payment WHERE invoice_id = i.id) AS got FROM invoice i) i
    WHERE got <> i.paid
      OR (i.state = 'paid') <> (i.number IS NOT NULL AND i.paid + i.credited = i.total AND i.state <> 'credited')
      OR (i.state = 'part paid' AND i.paid = 0)`,
  ),
  none(
    'Every bookkeeping entry sums to nought',
    `SELECT 'entry ' || entry || ' of ' || MIN(day) || ' does not balance' AS fault FROM posting GROUP BY entry HAVING SUM(amount) <> 0`,
  ),
  none(
    'Every issued invoice and every payment is in the books, with its amount',
    `SELECT i.number || ' is not in the books as it was issued' AS fault FROM invoice i
    WHERE i.number IS NOT NULL AND i.total <> 0 AND i.total <> (SELECT COALESCE(SUM(amount), 0) FROM posting
      WHERE invoice_id = i.id AND payment_id IS NULL AND account = 'receivables' AND amount > 0 AND day = i.issued_on)
    UNION ALL
    SELECT 'a payment of ' || p.received_on || ' is not in the books as it was received' FROM payment p
    WHERE p.amount <> (SELECT COALESCE(SUM(amount), 0) FROM posting
      WHERE payment_id = p.id AND account = 'money' AND day = p.received_on)`,
  ),
  none(
    'Invoice numbers run without a gap',
    `SELECT 'after ' || number || ' a number is missing' AS fault FROM invoice i
    WHERE sequence IS NOT NULL AND sequence < (SELECT MAX(sequence) FROM invoice)
      AND NOT EXISTS (SELECT 1 FROM invoice WHERE sequence = i.sequence + 1)
    UNION ALL SELECT 'the first invoice is not number 1' WHERE (SELECT MIN(sequence) FROM invoice) > 1`,
  ),
  {
    says: 'An issued invoice is as it was issued',
    find: async ({ query }) => {
      const issued = await query<InvoiceRow>('SELECT * FROM invoice WHERE number IS NOT NULL');
      return issued
        .filter((invoice) => !isAsIssued(invoice))
        .map((invoice) => `${nameOf(invoice)} was changed after it was issued`);
    },
  },
  {
    says: 'A locked period’s totals are those it was locked at',
    find: ({ query }) => changedPeriods(query),
  },
];

function addsUp(invoice: InvoiceRow, all: LineRow[]): boolean {
  const lines = all.filter((line) => line.invoice_id === invoice.id);
  const amountsHold = lines.every(
    (line) => Math.round((line.quantity * line.unit_price) / 100) === line.amount,
  );
  const totals = invoiceTotals(
    lines.map((line) => ({
      amount: (line.amount / 100).toFixed(2),
      taxRatePercent: line.tax_rate_id === null ? null : String(line.tax_percent / 10_000),
    })),
  );
  const cents = (amount: { toString(): string }) => Math.round(Number(amount.toString()) * 100);
  return (
    amountsHold &&
    cents(totals.net) === invoice.net &&
    cents(totals.tax) === invoice.tax &&
    cents(totals.total) === invoice.total
  );
}

function isAsIssued(invoice: InvoiceRow): boolean {
  return (
    createHash('sha256')
      .update(invoice.snapshot ?? '')
      .digest('hex') === invoice.snapshot_hash
  );
}

async function changedPeriods(query: Query): Promise<string[]> {
  const locked = await query<{ from_day: string; to_day: string; totals: string }>(
    'SELECT * FROM period',
  );
  const faults: string[] = [];
  for (const period of locked) {
    const head = { fromDay: period.from_day, toDay: period.to_day, workshopName: '', currency: '' };
    const now = await readSalesSheet((sql, params) => query(inlined(sql, params)), head);
    if (!isDeepStrictEqual(now.totals, JSON.parse(period.totals))) {
      faults.push(`${period.from_day} to ${period.to_day} sums differently now`);
    }
  }
  return faults;
}

/** The days of a period, set into the query: they come from the database, and hold nothing but digits and dashes. */
function inlined(sql: string, params: unknown[]): string {
  let place = 0;
  return sql.replaceAll('?', () => `'${String(params[place++]).replaceAll(/[^\d-]/g, '')}'`);
}
