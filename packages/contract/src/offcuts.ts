import { InvalidInput, offcutAreaMm2 } from '@hidewright/domain';
import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { areaMm2, choice, idParams, lengthBetween, optionalLine } from './fields.ts';
import { lot } from './lots.ts';

export const putOffcutBack = endpoint({
  method: 'POST',
  path: '/jobs/{id}/offcuts',
  summary: 'Put on the rack as a lot of its own what is left of leather that the job has taken',
  access: ['owner', 'maker'],
  creates: true,
  params: idParams,
  body: z
    .strictObject({
      /** The lot that it was cut from. */
      lotId: choice('Choose the lot that it was cut from.'),
      widthMm: lengthBetween('width', 10, 5000).nullable().default(null),
      heightMm: lengthBetween('height', 10, 5000).nullable().default(null),
      /** Width × height where it is left out. */
      areaMm2: areaMm2.nullable().default(null),
      place: optionalLine(60).default(''),
    })
    .superRefine((cut, context) => {
      if (context.issues.length > 0) return;
      try {
        offcutAreaMm2(cut);
      } catch (error) {
        if (!(error instanceof InvalidInput)) throw error;
        context.addIssue({ code: 'custom', path: [error.field], message: error.message });
      }
    }),
  reply: lot,
});
