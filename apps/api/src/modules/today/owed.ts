import type { Today } from '@hidewright/contract';
import type { Work } from '../../work.ts';

const byAge = `SELECT
    CASE WHEN due_on >= :today THEN 'not due' WHEN julianday(:today) - julianday(due_on) <= 30 THEN '1–30 days'
      WHEN julianday(:today) - julianday(due_on) <= 60 THEN '31–60' ELSE 'older' END AS age,
    SUM(total - paid - credited) AS hundredths
  FROM invoice WHERE state IN ('issued', 'part paid') GROUP BY age`;

const ages = ['not due', '1–30 days', '31–60', 'older'] as const;

/** What customers owe, by how long it has been due. */
export async function owed(work: Work): Promise<NonNullable<Today['owed']>> {
  const rows = await work.em.execute<{ age: string; hundredths: number }[]>(
    byAge.replaceAll(':today', '?'),
    [work.today, work.today, work.today],
  );
  return ages.map((age) => ({
    age,
    amount: ((rows.find((row) => row.age === age)?.hundredths ?? 0) / 100).toFixed(2),
  }));
}
