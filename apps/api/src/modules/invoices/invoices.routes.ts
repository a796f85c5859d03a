import { Router } from 'express';
import {
  changeInvoice,
  discardInvoice,
  draftInvoice as draftInvoiceEndpoint,
  issueInvoice as issueInvoiceEndpoint,
  listInvoices,
  listOrdersToInvoice,
  listOwed,
  listPayments,
  readInvoice,
  readInvoicePaper,
  recordPayment as recordPaymentEndpoint,
  removeInvoiceLine,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { discardDraft } from '../../flows/discard-draft.ts';
import { draftInvoice } from '../../flows/draft-invoice.ts';
import { issueInvoice } from '../../flows/issue-invoice.ts';
import { recordPayment } from '../../flows/record-payment.ts';
import { takeOffDraft } from '../../flows/take-off-draft.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { wrongState } from '../../http/problem.ts';
import { serve, serveFile } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { changeDraft } from './change-draft.ts';
import { describeInvoice, issuedWords } from './describe-invoice.ts';
import { findDraft, findInvoice } from './find-invoice.ts';
import { aged, sumByAge } from './invoice-ages.ts';
import type { Invoice } from './invoice.entity.ts';
import { listSummaries } from './invoice.repository.ts';
import { listOpen, listUninvoiced } from './owed.repository.ts';
import { listAllPayments } from './payments.repository.ts';

export function invoiceRoutes(context: Context): Router {
  const router = Router();

  serve(
    router,
    context,
    listInvoices,
    async ({ em, today }, { query: { cursor, limit, q, ...wanted } }) => {
      const asked = { below: readCursor(cursor), limit, q, ...wanted };
      return toPage(await listSummaries(em, today, asked), limit, (row) => row.id);
    },
  );

  serve(router, context, listOrdersToInvoice, async ({ em }) => ({
    items: await listUninvoiced(em),
  }));

  serve(router, context, listPayments, async ({ em }, { query: { cursor, limit, q } }) => {
    const rows = await listAllPayments(em, { below: readCursor(cursor), limit, q });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, listOwed, async ({ em, today }) => {
    const items = (await listOpen(em)).map((invoice) => aged(invoice, today));
    return { onDay: today, items, ...sumByAge(items) };
  });

  serve(router, context, readInvoice, async (work, { params }) =>
    describeInvoice(work, await findInvoice(work.em, params.id)),
  );

  serveFile(router, context, readInvoicePaper, async (work, { params }) => {
    const snapshot = issuedWords(await findInvoice(work.em, params.id));
    if (snapshot === null)
      throw wrongState('A draft has no paper yet. Issue the invoice first.', ['issue it']);
    const bytes = await context.papers.invoice(snapshot);
    return { name: `${snapshot.number}.pdf`, type: 'application/pdf', bytes };
  });

  serve(router, context, draftInvoiceEndpoint, async (work, { body }) =>
    describeInvoice(work, await draftInvoice(work, body)),
  );

  serve(router, context, changeInvoice, async (work, { params, body, ifMatch }) => {
    const invoice = await draftAsRead(work, params.id, ifMatch);
    await changeDraft(work, invoice, body.lines);
    return describeInvoice(work, invoice);
  });

  serve(router, context, discardInvoice, async (work, { params }) => {
    await discardDraft(work, await findDraft(work.em, params.id));
    return { discarded: true as const };
  });

  serve(router, context, removeInvoiceLine, async (work, { params, ifMatch }) => {
    const invoice = await draftAsRead(work, params.id, ifMatch);
    await takeOffDraft(work, invoice, params.position);
    return describeInvoice(work, invoice);
  });

  serve(router, context, issueInvoiceEndpoint, async (work, { params, body, ifMatch }) => {
    const draft = await draftAsRead(work, params.id, ifMatch);
    return describeInvoice(work, await issueInvoice(work, { invoiceId: draft.id, ...body }));
  });

  serve(router, context, recordPaymentEndpoint, async (work, { params, body }) =>
    describeInvoice(work, await recordPayment(work, { invoiceId: params.id, ...body })),
  );

  return router;
}

/** That it was issued meanwhile is said before that it was changed. */
async function draftAsRead(work: Work, id: number, ifMatch: number): Promise<Invoice> {
  const invoice = await findDraft(work.em, id);
  await requireVersion(work.em, { kind: 'invoice', id, version: invoice.version }, ifMatch);
  return invoice;
}
