import { issueInvoice } from '../../flows/issue-invoice.ts';
import { sellFromShelf } from '../../flows/sell-from-shelf.ts';
import { FinishedPiece } from '../../modules/finished-pieces/finished-piece.entity.ts';
import type { Work } from '../../work.ts';
import { shelfSale } from './scenario/shelf-sale.ts';
import type { Stage } from './stage.ts';

/** A shop took the zip-pulls that lay on the shelf, good ones and seconds, and got one invoice for both. */
export function planShelfSale({ shop, year, furnished }: Stage): void {
  let draft = { id: 0 };
  const customerId = furnished.customers.id(shelfSale.customer);
  const patternId = furnished.patterns.id(shelfSale.pattern);
  year.planAfter(shelfSale.daysBefore, 0, '11:10', () =>
    shop.as('owner', async (work) => {
      for (const { sort, ...sold } of shelfSale.lines) {
        const pieceId = await lying(work, patternId, sort);
        const draftId = draft.id === 0 ? null : draft.id;
        const sale = { customerId, draftId, taxRateId: furnished.taxRateId, ...sold };
        draft = await sellFromShelf(work, { pieceId, ...sale });
      }
    }),
  );
  year.planAfter(shelfSale.daysBefore, 1, '09:30', async () => {
    await shop.as('bookkeeper', (work) =>
      issueInvoice(work, { invoiceId: draft.id, issuedOn: work.today }),
    );
  });
}

async function lying(
  { em }: Work,
  patternId: number,
  sort: FinishedPiece['sort'],
): Promise<number> {
  return (await em.findOneOrFail(FinishedPiece, { patternId, sort, customerId: null })).id;
}
