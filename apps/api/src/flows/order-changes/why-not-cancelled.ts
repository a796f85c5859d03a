import type { EntityManager } from '@mikro-orm/sqlite';
import type { Order } from '../../modules/orders/order.entity.ts';
import { allowedFor } from '../../modules/orders/order-states.ts';

interface Refusal {
  because: string;
  allowed: string[];
}

interface InvoiceRow {
  number: string | null;
  state: string;
}

/** Why an order cannot be cancelled, and what to do first; undefined where it can. */
export async function whyNotCancelled(
  em: EntityManager,
  order: Order,
): Promise<Refusal | undefined> {
  const { number, state } = order;
  if (state === 'cancelled') return { because: `${number} is cancelled already.`, allowed: [] };
  if (state === 'part shipped' || state === 'shipped' || state === 'closed')
    return {
      because: `Something of ${number} has left the shop already, so it cannot be cancelled. Agree with the customer what comes back, and what it is worth.`,
      allowed: allowedFor(state),
    };
  const [invoice] = await em.execute<InvoiceRow[]>(
    `SELECT number, state FROM invoice WHERE order_id = ? AND state <> 'credited' ORDER BY id DESC LIMIT 1`,
    [order.id],
  );
  return invoice && billed(number, invoice);
}

function billed(order: string, { number, state }: InvoiceRow): Refusal {
  if (number === null || state === 'draft')
    return {
      because: `${order} has a draft invoice. Discard that draft first, then cancel the order.`,
      allowed: ['discard the draft invoice'],
    };
  return {
    because: `${order} was invoiced as ${number}. It can be cancelled once ${number} is credited in full: settle that with the bookkeeper first.`,
    allowed: [],
  };
}
