import { hardwareUnits } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { choice, id, lengthBetween, optionalLine, positiveCount } from './fields.ts';

const kitPart = z.strictObject({
  hardwareId: choice('Choose a part.'),
  quantity: positiveCount.max(1000, 'Enter at most 1,000 in one kit.'),
});

const standIn = z.strictObject({
  hardwareId: choice('Choose what stands in for it.'),
  /** Whether this one stands in for that one as well. */
  bothWays: z.boolean(),
});

/** What most hardware needs nobody to say. */
export const hardwareDetails = {
  unit: z.enum(hardwareUnits, 'Choose what one of it is.'),
  metal: optionalLine(40),
  colour: optionalLine(40),
  /** Where it lies. */
  bin: optionalLine(40),
  /** The customer brings it: it is counted, and never bought. */
  fromCustomer: z.boolean(),
  /** A kit that costs what its parts cost. */
  priceFromParts: z.boolean(),
  /** What a kit is made up of; empty where it is none. */
  parts: z.array(kitPart).max(10, 'Keep a kit to 10 parts.'),
  /** What may be taken in its place. */
  standIns: z.array(standIn).max(10, 'Keep it to 10.'),
  postLengthMm: lengthBetween('length of the post', 0.5, 100).nullable(),
  /** The folded stack that it holds. */
  stackMinMm: lengthBetween('thinnest stack', 0, 100).nullable(),
  stackMaxMm: lengthBetween('thickest stack', 0.1, 100).nullable(),
  /** By the name or number that the shop gives it; empty where none is needed. */
  settingDie: optionalLine(60),
  settingDieHere: z.boolean(),
};

/** The same where nobody said anything. */
export const hardwareDetailsUnsaid = {
  unit: hardwareDetails.unit.default('piece'),
  metal: hardwareDetails.metal.default(''),
  colour: hardwareDetails.colour.default(''),
  bin: hardwareDetails.bin.default(''),
  fromCustomer: hardwareDetails.fromCustomer.default(false),
  priceFromParts: hardwareDetails.priceFromParts.default(false),
  parts: hardwareDetails.parts.default([]),
  standIns: hardwareDetails.standIns.default([]),
  postLengthMm: hardwareDetails.postLengthMm.default(null),
  stackMinMm: hardwareDetails.stackMinMm.default(null),
  stackMaxMm: hardwareDetails.stackMaxMm.default(null),
  settingDie: hardwareDetails.settingDie.default(''),
  settingDieHere: hardwareDetails.settingDieHere.default(true),
};

/** The same as it is read. */
export const hardwareDetailsKept = {
  unit: z.enum(hardwareUnits),
  metal: z.string(),
  colour: z.string(),
  bin: z.string(),
  fromCustomer: z.boolean(),
  priceFromParts: confidential(z.boolean()),
  parts: z.array(z.object({ hardwareId: id, name: z.string(), quantity: z.int(), free: z.int() })),
  /** The kits that it is part of: it may not be a kit itself. */
  partOf: z.array(z.object({ hardwareId: id, name: z.string() })),
  standIns: z.array(
    z.object({ hardwareId: id, name: z.string(), bothWays: z.boolean(), free: z.int() }),
  ),
  postLengthMm: z.string().nullable(),
  stackMinMm: z.string().nullable(),
  stackMaxMm: z.string().nullable(),
  settingDie: z.string(),
  settingDieHere: z.boolean(),
};
