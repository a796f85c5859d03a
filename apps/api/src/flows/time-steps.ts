import type { LoggedReading, TimeReadings } from '@hidewright/contract';
import { ticketSteps, toAtMost } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import { invalid } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { definitionOf, findPattern, latestVersion } from '../modules/patterns/pattern-versions.ts';
import { TimeReading } from '../modules/time-readings/time-reading.entity.ts';
import type { Work } from '../work.ts';

const mostReadings = 1000;

/** The readings of a pattern's steps, and what its tickets' logs say, newest first. @throws {Problem} 404 */
export async function readTimeReadings(
  { em }: Pick<Work, 'em'>,
  patternId: number,
): Promise<TimeReadings> {
  await findPattern({ em }, patternId);
  const readings = await em.find(
    TimeReading,
    { patternId },
    { orderBy: { id: 'desc' }, limit: mostReadings },
  );
  return {
    readings: readings.map(({ id, stepName, seconds, at, personName }) => ({
      ...{ id, stepName, at, personName },
      seconds: seconds.toString(),
    })),
    logged: await loggedFor({ em }, patternId),
  };
}

/**
 * Keeps readings of one of a pattern's steps.
 * @throws {Problem} 404, 422 when the pattern has no such step
 */
export async function addTimeReadings(
  work: Work,
  patternId: number,
  { stepName, seconds }: { stepName: string; seconds: string[] },
): Promise<void> {
  const pattern = await findPattern(work, patternId);
  const { work: plan } = definitionOf(await latestVersion(work, pattern));
  if (!ticketSteps(plan).some(({ name }) => name === stepName)) {
    const message = `${pattern.name} has no step of that name now. Choose one from the list.`;
    throw invalid([{ field: 'stepName', message }]);
  }
  for (const reading of seconds) {
    work.em.create(TimeReading, {
      ...{ patternId, stepName, seconds: new Decimal(reading) },
      at: work.now.toISOString(),
      personId: work.actor.id,
      personName: work.actor.name,
    });
  }
  await work.em.flush();
  await logDeed(work, {
    action: `timed ${stepName} of ${pattern.name}`,
    subjectKind: 'pattern',
    subjectId: pattern.id,
    detail: { readings: seconds.length },
  });
}

interface LogRow {
  step_name: string;
  units: number;
  minutes: number;
  number: string;
  at: string;
  person_name: string;
}

/** Rows that count pieces as well as minutes: each is the average of what it counts. */
async function loggedFor({ em }: Pick<Work, 'em'>, patternId: number): Promise<LoggedReading[]> {
  const rows = await em.execute<LogRow[]>(
    `SELECT s.name AS step_name, l.good + l.rejects + l.seconds AS units, l.minutes, j.number, l.at, l.person_name
    FROM bench_log l JOIN job_step s ON s.id = l.job_step_id JOIN job j ON j.id = s.job_id
      JOIN pattern_version v ON v.id = j.pattern_version_id JOIN customer_order o ON o.id = j.order_id
    WHERE v.pattern_id = ? AND o.state <> 'cancelled' AND l.minutes > 0 AND l.good + l.rejects + l.seconds > 0
    ORDER BY l.id DESC LIMIT 200`,
    [patternId],
  );
  return rows.map((row) => ({
    stepName: row.step_name,
    seconds: toAtMost(unscaled(row.minutes, 2).times(60).div(row.units), 2),
    units: row.units,
    jobNumber: row.number,
    at: row.at,
    personName: row.person_name,
  }));
}
