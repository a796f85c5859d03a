import { hardwareUnits } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import { id, idParams, line, money, paperNumber, version } from './fields.ts';

export const claimStates = ['open', 'credited', 'given up'] as const;
export type ClaimState = (typeof claimStates)[number];

const claimedLot = z.object({
  receiptLineId: id,
  lotId: id,
  lotTag: z.string(),
  leatherName: z.string(),
  markedAreaMm2: z.string(),
  measuredAreaMm2: z.string(),
});

/** What went back to its supplier: of a lot an area, of hardware a count. */
const sentBack = z.object({
  on: z.string(),
  lotId: id.nullable(),
  lotTag: z.string().nullable(),
  hardwareId: id.nullable(),
  /** Of the leather, or of the hardware. */
  name: z.string(),
  unit: z.enum(hardwareUnits).nullable(),
  areaMm2: z.string().nullable(),
  quantity: z.int().nullable(),
  reason: z.string(),
});

export const supplierClaim = z
  .object({
    id,
    purchaseOrderId: id,
    purchaseOrderNumber: paperNumber,
    supplierName: z.string(),
    state: z.enum(claimStates),
    /** Of lots that are short of their mark; null where it is for what went back. */
    short: z
      .object({ receiptId: id, lots: z.array(claimedLot), missingAreaMm2: z.string() })
      .nullable(),
    sentBack: sentBack.nullable(),
    /** What was paid for the missing area, or for what went back. */
    worth: confidential(z.string()),
    text: z.string(),
    sentBy: z.enum(['mail', 'hand']),
    openedAt: z.string(),
    credited: confidential(z.string().nullable()),
    /** Each note of what was credited, first to last; a later one puts an earlier one right, and says why. */
    credits: confidential(
      z.array(
        z.object({ credited: z.string(), reason: z.string(), at: z.string(), by: z.string() }),
      ),
    ),
    /** Why it was given up. */
    note: z.string(),
    closedAt: z.string().nullable(),
    version,
  })
  .meta({ id: 'SupplierClaim' });
export type SupplierClaim = z.infer<typeof supplierClaim>;

export const draftClaim = endpoint({
  method: 'GET',
  path: '/receipts/{id}/claim-draft',
  summary:
    'What could be claimed of a delivery: the lots short of their mark, and a letter to start from',
  access: ['owner'],
  params: idParams,
  reply: z.object({
    supplierName: z.string(),
    supplierEmail: z.string(),
    lots: z.array(claimedLot),
    missingAreaMm2: z.string(),
    worth: z.string(),
    text: z.string(),
  }),
});

const letter = z
  .string('Write what you claim.')
  .trim()
  .min(1, 'Write what you claim.')
  .max(4000, 'Keep it to 4,000 characters.')
  .regex(/^(?:[^\p{Cc}]|[\n\r\t])*$/u, 'Leave out control characters.');

export const openClaim = endpoint({
  method: 'POST',
  path: '/receipts/{id}/claims',
  summary: 'Claim the area that lots are short of their mark, by e-mail or by hand',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({
    by: z.enum(['mail', 'hand'], 'Choose by e-mail or by hand.'),
    text: letter,
  }),
  reply: supplierClaim,
});

export const listClaims = endpoint({
  method: 'GET',
  path: '/purchase-orders/{id}/claims',
  summary: 'What was claimed on an order, for what is short and for what went back',
  access: ['owner', 'bookkeeper'],
  params: idParams,
  reply: z.object({ items: z.array(supplierClaim) }),
});

/** A credit above the claim, such as with freight; otherwise it is taken for a slip. */
const moreThanClaimed = z.boolean().default(false);

export const closeClaim = endpoint({
  method: 'PATCH',
  path: '/supplier-claims/{id}',
  summary: 'Note what the supplier credited, or give the claim up',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.discriminatedUnion(
    'state',
    [
      z.strictObject({
        state: z.literal('credited'),
        credited: money.refine((text) => Number(text) > 0, 'Enter what was credited, above 0.'),
        moreThanClaimed,
      }),
      z.strictObject({
        state: z.literal('given up'),
        note: line(200, 'Say why, in a few words.'),
      }),
    ],
    'Say whether it was credited or is given up.',
  ),
  reply: supplierClaim,
});

export const correctCredit = endpoint({
  method: 'PATCH',
  path: '/supplier-claims/{id}/credit',
  summary: 'Put right what a claim was credited; 0 opens the claim again',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({
    credited: money,
    moreThanClaimed,
    reason: line(200, 'Say what was wrong, in a few words.'),
  }),
  reply: supplierClaim,
});
