import { drawInvoice } from './invoice-pdf.ts';
import { drawLabels } from './label-sheet-pdf.ts';
import { drawLayout } from './layout-pdf.ts';
import { drawPurchaseOrder } from './purchase-order-pdf.ts';
import { drawQuote } from './quote-pdf.ts';
import { drawTemplate } from './template-pdf.ts';

/** What the program puts on paper: a snapshot in, bytes out. */
export const papers = {
  quote: drawQuote,
  invoice: drawInvoice,
  purchaseOrder: drawPurchaseOrder,
  labels: drawLabels,
  layout: drawLayout,
  template: drawTemplate,
};
export type Papers = typeof papers;
