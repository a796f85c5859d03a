import type { Job as Ticket } from '@hidewright/contract';
import type { Layout } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Customer } from '../../modules/customers/customer.entity.ts';
import { findJob, stepsOf } from '../../modules/jobs/find-job.ts';
import type { Job } from '../../modules/jobs/job.entity.ts';
import type { JobStep } from '../../modules/jobs/job-step.entity.ts';
import { minutesLogged } from '../../modules/jobs/minutes-logged.ts';
import { findLayout, pathOf } from '../../modules/layouts/stored-layouts.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import { findOrder } from '../../modules/orders/find-order.ts';
import { PatternVersion } from '../../modules/patterns/pattern-version.entity.ts';
import { definitionOf, findPattern } from '../../modules/patterns/pattern-versions.ts';
import { estimateOf } from '../job-estimate.ts';
import { readSetLines } from '../set-hardware.ts';
import { ticketLogs, ticketSteps } from './ticket-steps.ts';
import { ticketHardware } from './ticket-hardware.ts';
import { stockOfJob, ticketLots } from './ticket-stock.ts';
import { ticketTool } from './ticket-tools.ts';

/** The ticket, with all that the maker needs at the bench. @throws {Problem} 404 */
export async function readTicket(em: EntityManager, jobId: number): Promise<Ticket> {
  const job = await findJob(em, jobId);
  const steps = await stepsOf(em, jobId);
  return {
    ...ownFields(job),
    ...(await orderFields(em, job)),
    ...(await madeOf(em, job)),
    ...(await layoutFields(em, job)),
    ...stepFields(job, steps),
    logs: await ticketLogs(em, steps),
  };
}

function ownFields(job: Job) {
  const {
    id,
    number,
    state,
    orderId,
    quantity,
    cutCount,
    containers,
    good,
    seconds,
    startedAt,
    finishedAt,
    version,
  } = job;
  return {
    id,
    number,
    state,
    orderId,
    quantity,
    cutCount,
    containers,
    good,
    seconds,
    startedAt,
    finishedAt,
    version,
  };
}

async function orderFields(em: EntityManager, job: Job) {
  const order = await findOrder(em, job.orderId);
  const customer = await em.findOneOrFail(Customer, order.customerId);
  return {
    orderNumber: order.number,
    orderState: order.state,
    awaits: order.awaits,
    title: order.title,
    customerName: customer.name,
    promisedOn: order.promisedOn,
    inHandsOn: order.inHandsOn,
  };
}

async function madeOf(em: EntityManager, job: Job) {
  const version = await em.findOneOrFail(PatternVersion, job.patternVersionId);
  const pattern = await findPattern({ em }, version.patternId);
  const definition = definitionOf(version);
  const { needsDie, needsPlate } = definition;
  const { leatherId, leatherAreaMm2, hardware } = estimateOf(job);
  const leather = await em.findOneOrFail(Leather, leatherId);
  const stock = await stockOfJob(em, job.id);
  const { customerId, optionName } = await findOrder(em, job.orderId);
  const [setLines = []] = await readSetLines(em, [{ definition, option: optionName }]);
  const tool = (kind: 'cutting die' | 'stamp plate') =>
    ticketTool(em, job, { kind, patternId: pattern.id, customerId });
  return {
    patternId: pattern.id,
    patternName: pattern.name,
    patternVersion: version.number,
    leatherName: leather.name,
    neededAreaMm2: leatherAreaMm2,
    needsDie,
    needsPlate,
    die: needsDie ? await tool('cutting die') : null,
    plate: needsPlate ? await tool('stamp plate') : null,
    lots: await ticketLots(em, stock, leatherId, setLines),
    ...(await ticketHardware(em, stock, hardware)),
  };
}

async function layoutFields(em: EntityManager, job: Job) {
  const stored = await findLayout(em, job.layoutId);
  return { layout: stored.result as Layout, outlinePath: pathOf(stored) };
}

function stepFields(job: Job, steps: JobStep[]) {
  return {
    plannedMinutes: job.plannedMinutes.toString(),
    loggedMinutes: minutesLogged(steps),
    steps: ticketSteps(job, steps),
  };
}
