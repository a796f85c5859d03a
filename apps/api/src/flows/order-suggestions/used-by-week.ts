import { daysBetween } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';

interface Row {
  /** "leather 3", "hardware 7" */
  key: string;
  first: string;
  /** [weeks ago, used in it], as JSON */
  weeks: string | null;
}

const weeksOfAYear = 52;

/** What jobs took, less what they gave back; counts and adjustments are no use, nor is what is out to be worked on. */
const sql = `
  WITH moved AS MATERIALIZED (
    SELECT CASE WHEN m.hardware_id IS NULL THEN 'leather ' || lot.leather_id
        ELSE 'hardware ' || m.hardware_id END AS key, m.day,
      CAST(julianday(?) - julianday(m.day) AS INTEGER) / 7 AS week,
      CASE WHEN m.kind IN ('take', 'return') AND m.purchase_line_id IS NULL THEN -m.quantity ELSE 0 END AS used
    FROM stock_movement m LEFT JOIN lot ON lot.id = m.lot_id WHERE m.day <= ?),
  by_week AS (
    SELECT key, week, MIN(day) AS first, SUM(used) AS used FROM moved GROUP BY key, week)
  SELECT key, MIN(first) AS first,
    json_group_array(json_array(week, used)) FILTER (WHERE week < ${weeksOfAYear} AND used <> 0) AS weeks
  FROM by_week GROUP BY key`;

/** What was used of each thing in each whole week since it is known, at most a year, oldest first; as the ledger counts. */
export async function readUsedByWeek(
  em: EntityManager,
  today: string,
): Promise<(key: string) => number[]> {
  const rows = await em.execute<Row[]>(sql, [today, today]);
  const known = new Map(rows.map((row) => [row.key, row]));
  return (key) => {
    const row = known.get(key);
    return row === undefined ? [] : seriesOf(row, today);
  };
}

function seriesOf({ first, weeks }: Row, today: string): number[] {
  const count = Math.min(weeksOfAYear, Math.floor((daysBetween(first, today) + 1) / 7));
  const used = new Map(JSON.parse(weeks ?? '[]') as [number, number][]);
  const taken = Array.from({ length: count }, (_, at) => used.get(count - 1 - at) ?? 0);
  return withReturnsCarriedBack(taken);
}

/** What comes back in a week in which less is taken was not used in the weeks before it. */
function withReturnsCarriedBack(taken: readonly number[]): number[] {
  const series: number[] = [];
  let back = 0;
  for (const used of taken.toReversed()) {
    series.unshift(Math.max(0, used - back));
    back = Math.max(0, back - used);
  }
  return series;
}
