import { hardwareUnits } from '@hidewright/domain';
import { z } from 'zod';
import { count, day, id, instant, paperNumber, version } from './fields.ts';
import { layout } from './layouts.ts';
import { awaited, orderState } from './orders.ts';
import { stepUnits } from './work-plan.ts';

export const jobStates = ['waiting', 'ready', 'at the bench', 'paused', 'finished'] as const;
export const jobState = z.enum(jobStates);
export type JobState = z.infer<typeof jobState>;

const jobStep = z
  .object({
    id,
    position: count,
    name: z.string(),
    per: z.enum(stepUnits),
    plannedMinutes: z.string(),
    /** How many of what it is counted per can pass here, after the rejects of the steps before. */
    limit: count,
    good: count,
    rejects: count,
    seconds: count,
    minutes: z.string(),
    /** Nothing is left to log but a correction. */
    done: z.boolean(),
    /** A short caution for this kind of work. */
    caution: z
      .object({ level: z.enum(['WARNING', 'CAUTION', 'NOTICE']), text: z.string() })
      .nullable(),
  })
  .meta({ id: 'JobStep' });
export type JobStep = z.infer<typeof jobStep>;

const jobTool = z
  .object({
    id,
    number: z.string(),
    kind: z.enum(['cutting die', 'stamp plate']),
    name: z.string(),
    slot: z.string(),
    lifeLeft: z.int(),
  })
  .meta({ id: 'JobTool' });
export type JobTool = z.infer<typeof jobTool>;

const jobLot = z
  .object({
    lotId: id,
    tag: z.string(),
    form: z.string(),
    shade: z.string(),
    place: z.string(),
    widthMm: z.string().nullable(),
    heightMm: z.string().nullable(),
    /** Still held for this job. */
    heldAreaMm2: z.string(),
    /** Of it in all, for whomever. */
    onHandAreaMm2: z.string(),
    /** Held for jobs and not there, since a count found less. */
    missingAreaMm2: z.string(),
    /** On hand and held by nobody. */
    freeAreaMm2: z.string(),
    /** Taken for this job, less what came back. */
    takenAreaMm2: z.string(),
    /** What would mix with the leather that the order has already; null where nothing does. */
    mix: z.object({ of: z.enum(['shades', 'lots']), sentence: z.string() }).nullable(),
    /** What of the job's hardware does not fit the lot's own weight, in sentences; it stops nothing. */
    misfits: z.array(z.string()),
  })
  .meta({ id: 'JobLot' });
export type JobLot = z.infer<typeof jobLot>;

const jobHardware = z
  .object({
    hardwareId: id,
    name: z.string(),
    unit: z.enum(hardwareUnits),
    needed: count,
    held: count,
    /** Of it in all, for whomever. */
    onHand: count,
    /** Held for jobs and not there, since a count found less. */
    missing: count,
    free: z.int(),
    taken: z.int(),
    /** What the job needs and this may be taken in place of, alone or as a part of a kit. */
    standsInFor: z.array(z.object({ name: z.string(), inKit: z.string().nullable() })),
  })
  .meta({ id: 'JobHardware' });
export type JobHardware = z.infer<typeof jobHardware>;

const benchLog = z
  .object({
    id,
    stepId: id,
    stepName: z.string(),
    good: z.int(),
    rejects: z.int(),
    seconds: z.int(),
    minutes: z.string(),
    note: z.string(),
    at: instant,
    personName: z.string(),
  })
  .meta({ id: 'BenchLog' });
export type BenchLog = z.infer<typeof benchLog>;

/** The ticket: all that the maker needs, and nothing that the maker must not see. */
export const job = z
  .object({
    id,
    number: paperNumber,
    state: jobState,
    orderId: id,
    orderNumber: paperNumber,
    orderState,
    awaits: z.array(awaited),
    title: z.string(),
    customerName: z.string(),
    patternId: id,
    patternName: z.string(),
    patternVersion: count,
    leatherName: z.string(),
    quantity: count,
    cutCount: count,
    containers: count,
    layout,
    /** SVG path data in mm; null for a hand count. */
    outlinePath: z.string().nullable(),
    neededAreaMm2: z.string(),
    promisedOn: day,
    inHandsOn: day.nullable(),
    plannedMinutes: z.string(),
    loggedMinutes: z.string(),
    needsPlate: z.boolean(),
    needsDie: z.boolean(),
    plate: jobTool.nullable(),
    die: jobTool.nullable(),
    lots: z.array(jobLot),
    hardware: z.array(jobHardware),
    /** Of which something is free and nothing is needed, held or taken: it may be taken in place of what is needed. */
    standIns: z.array(jobHardware),
    steps: z.array(jobStep),
    logs: z.array(benchLog),
    good: count,
    seconds: count,
    startedAt: instant.nullable(),
    finishedAt: instant.nullable(),
    version,
  })
  .meta({ id: 'Job' });
export type Job = z.infer<typeof job>;
