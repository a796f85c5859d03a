import { drawInvoice } from './invoice-pdf.ts';
import { drawLayout } from './layout-pdf.ts';
import { drawQuote } from './quote-pdf.ts';

/** What the program puts on paper: a snapshot in, bytes out. */
export const papers = { quote: drawQuote, invoice: drawInvoice, layout: drawLayout };
export type Papers = typeof papers;
