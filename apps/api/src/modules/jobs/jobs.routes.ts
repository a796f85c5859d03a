import { Router } from 'express';
import {
  compareJob,
  finishJob as finishJobEndpoint,
  holdForJob as holdForJobEndpoint,
  letGo,
  listJobs,
  logBench as logBenchEndpoint,
  pauseJob as pauseJobEndpoint,
  readBenchHours,
  readJob,
  readVariances,
  resumeJob as resumeJobEndpoint,
  returnFromJob as returnFromJobEndpoint,
  takeForJob as takeForJobEndpoint,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { compareFinished } from '../../flows/compare-job.ts';
import { explainJob } from '../../flows/explain-job.ts';
import { finishJob } from '../../flows/finish-job.ts';
import { holdForJob, letGoForJob } from '../../flows/hold-for-job.ts';
import { logBench } from '../../flows/log-bench.ts';
import { pauseJob, resumeJob } from '../../flows/pause-job.ts';
import { planBench } from '../../flows/plan-bench.ts';
import { returnFromJob } from '../../flows/return-from-job.ts';
import { takeForJob } from '../../flows/take-for-job.ts';
import { readTicket } from '../../flows/ticket/read-ticket.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { findJobs } from './jobs.repository.ts';

export function jobRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listJobs, async ({ em }, { query }) => {
    const { limit, q, state } = query;
    const open = query.open === undefined ? undefined : query.open === 'true';
    const rows = await findJobs(em, { below: readCursor(query.cursor), limit, q, state, open });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, readJob, ({ em }, { params }) => readTicket(em, params.id));

  serve(router, context, logBenchEndpoint, async (work, { params, body }) => {
    await logBench(work, params.id, body);
    return readTicket(work.em, params.id);
  });

  serve(router, context, takeForJobEndpoint, async (work, { params, body }) => {
    await takeForJob(work, params.id, body);
    return readTicket(work.em, params.id);
  });

  serve(router, context, holdForJobEndpoint, async (work, { params, body }) => {
    await holdForJob(work, params.id, body);
    return readTicket(work.em, params.id);
  });

  serve(router, context, letGo, async (work, { params, body }) => {
    await letGoForJob(work, params.id, body);
    return readTicket(work.em, params.id);
  });

  serve(router, context, returnFromJobEndpoint, async (work, { params, body }) => {
    await returnFromJob(work, params.id, body);
    return readTicket(work.em, params.id);
  });

  serve(router, context, finishJobEndpoint, async (work, { params, body }) => {
    await finishJob(work, params.id, body);
    return readTicket(work.em, params.id);
  });

  serve(router, context, pauseJobEndpoint, async (work, { params }) => {
    await pauseJob(work, params.id);
    return readTicket(work.em, params.id);
  });

  serve(router, context, resumeJobEndpoint, async (work, { params }) => {
    await resumeJob(work, params.id);
    return readTicket(work.em, params.id);
  });

  serve(router, context, compareJob, (work, { params }) => compareFinished(work, params.id));

  serve(router, context, readVariances, (work, { params }) => explainJob(work, params.id));

  serve(router, context, readBenchHours, (work, { query }) => planBench(work, query.days));

  return router;
}
