import type { Work } from '../../work.ts';
import { Customer } from '../customers/customer.entity.ts';
import { Order } from '../orders/order.entity.ts';
import type { Invoice } from './invoice.entity.ts';

/** What an invoice without an order is for, where an order would give its title. */
export const soldFromShelf = 'Pieces from the shelf';

/** A draft has no number: it is named by its order, or by who buys from the shelf. */
export async function whoseDraft({ em }: Work, { orderId, customerId }: Invoice): Promise<string> {
  return orderId === null
    ? (await em.findOneOrFail(Customer, customerId)).name
    : (await em.findOneOrFail(Order, orderId)).number;
}
