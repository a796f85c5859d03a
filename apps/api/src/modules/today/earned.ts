import { Decimal } from 'decimal.js';
import type { Today } from '@hidewright/contract';
import type { RunInput, RunNumbers } from '@hidewright/domain';
import { moneyText } from '../../http/decimal-text.ts';
import type { Work } from '../../work.ts';
import { rungsOf } from '../quotes/quote-numbers.ts';
import { Workshop } from '../workshop/workshop.entity.ts';

interface Row {
  number: string;
  title: string;
  finishedOn: string;
  quantity: number;
  optionName: string | null;
  input: string;
  numbers: string;
  minutes: number;
}

const finished = `SELECT j.number, o.title, substr(j.finished_at, 1, 10) AS finishedOn, o.quantity, o.option_name AS optionName, q.input,
    q.numbers,
    (SELECT SUM(minutes) FROM job_step WHERE job_id = j.id) AS minutes
  FROM job j JOIN customer_order o ON o.id = j.order_id JOIN quote q ON q.id = o.quote_id
  WHERE j.state = 'finished' AND o.state <> 'cancelled' ORDER BY j.finished_at DESC LIMIT 12`;

/** What an hour left on the latest finished runs: what was bought as quoted, the hours as logged. */
export async function earned(work: Work): Promise<NonNullable<Today['earned']>> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const rows = await work.em.execute<Row[]>(finished);
  const jobs = rows.filter((row) => row.minutes > 0).flatMap(perHour);
  return { target: moneyText(workshop.targetPerHour), jobs: jobs.reverse() };
}

function perHour(row: Row): NonNullable<Today['earned']>['jobs'] {
  const input = JSON.parse(row.input) as RunInput;
  const rung = rungsOf(JSON.parse(row.numbers) as RunNumbers, row.optionName).find(
    (each) => each.quantity === row.quantity,
  );
  if (rung === undefined) return [];
  const benchHours = new Decimal(row.minutes).dividedBy(6000);
  const allHours = benchHours.plus(new Decimal(input.deskMinutesPerOrder).dividedBy(60));
  const afterWages = new Decimal(rung.left)
    .minus(allHours.times(input.wagePerHour))
    .minus(benchHours.times(input.overheadPerHour ?? 0));
  return [
    {
      number: row.number,
      title: row.title,
      finishedOn: row.finishedOn,
      perBenchHour: new Decimal(rung.left).dividedBy(benchHours).toFixed(2),
      perHourAllIn: afterWages.dividedBy(allHours).toFixed(2),
    },
  ];
}
