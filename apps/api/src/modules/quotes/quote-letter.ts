import type { QuotePaper } from '../../papers/quote-pdf.ts';
import { sayDay } from '../../say-day.ts';

/** The words that go with a quote, by mail or copied by hand. */
export function quoteLetter(
  paper: QuotePaper,
  linkUrl: string,
  addressee: string,
): { subject: string; text: string } {
  const paragraphs = [
    `Good day ${addressee},`,
    `here is our quote ${paper.number} for ${paper.title}${inHands(paper.inHandsOn)}:`,
    paper.breaks
      .map((rung) => `  ${rung.quantity} at ${rung.priceEach} each: ${rung.goodsTotal}`)
      .join('\n'),
    ...paper.options.map(
      ({ name, breaks }) =>
        `${name}:\n${breaks.map((rung) => `  ${rung.quantity} at ${rung.priceEach} each: ${rung.goodsTotal}`).join('\n')}`,
    ),
    paper.tooling.map((tool) => `${tool.name}, charged once: ${tool.charge}`).join('\n'),
    `Prices in ${paper.currency}. Sales tax, where it applies, is added on the invoice.`,
    paper.message,
    `Choose a quantity and agree here:\n${linkUrl}`,
    `The link is for you alone. The offer is good until ${sayDay(paper.validUntil)}.`,
    [paper.shopName, paper.shopAddress].filter((part) => part !== '').join('\n'),
  ];
  return {
    subject: `${paper.shopName}: quote ${paper.number}, ${paper.title}`,
    text: `${paragraphs.filter((words) => words !== '').join('\n\n')}\n`,
  };
}

const inHands = (day: string | null) => (day === null ? '' : `, in your hands on ${sayDay(day)}`);
