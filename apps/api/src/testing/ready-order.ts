import { Decimal } from 'decimal.js';
import type { Context } from '../context.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { StoredLayout } from '../modules/layouts/layout.entity.ts';
import { Order } from '../modules/orders/order.entity.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { inTransaction, theProgram, type Work } from '../work.ts';

interface ReadyOrder {
  customerName: string;
  title: string;
  quantity: number;
  priceEach: string;
  tooling: string;
  state: Order['state'];
}

let made = 0;

/** An order whose goods are ready for the books, written as rows: the books do not ask how it came to be. */
export async function makeReadyOrder(
  context: Context,
  wanted: Partial<ReadyOrder> = {},
): Promise<Order> {
  made += 1;
  const order = {
    quantity: 100,
    priceEach: '4.20',
    tooling: '85.00',
    state: 'shipped',
    ...wanted,
  } as ReadyOrder;
  return inTransaction(context, theProgram, async (work) => {
    const customer = await findOrMakeCustomer(work, order.customerName ?? 'Brambling Brewery');
    const quote = await makeQuote(work, customer.id);
    const goodsTotal = new Decimal(order.priceEach)
      .times(order.quantity)
      .toDecimalPlaces(2, Decimal.ROUND_HALF_UP);
    const toolingCharge = new Decimal(order.tooling);
    const row = work.em.create(Order, {
      number: `O-${String(made).padStart(4, '0')}`,
      quoteId: quote.id,
      customerId: customer.id,
      title: order.title ?? 'Round coasters',
      quantity: order.quantity,
      priceEach: new Decimal(order.priceEach),
      goodsTotal,
      toolingCharge,
      total: goodsTotal.plus(toolingCharge),
      state: order.state,
      awaits: [],
      promisedOn: work.today,
      takenOnAt: work.now.toISOString(),
    });
    await work.em.flush();
    return row;
  });
}

async function findOrMakeCustomer(work: Work, name: string): Promise<Customer> {
  const existing = await work.em.findOne(Customer, { name });
  if (existing !== null) return existing;
  const customer = work.em.create(Customer, { name, createdAt: work.now.toISOString() });
  await work.em.flush();
  return customer;
}

async function makeQuote(work: Work, customerId: number): Promise<Quote> {
  const at = { createdAt: work.now.toISOString() };
  const pattern = work.em.create(Pattern, { name: `Pattern ${made}`, latestVersion: 1 });
  const layout = work.em.create(StoredLayout, {
    ...at,
    inputHash: `hash ${made}`,
    input: {},
    result: {},
    pieces: 1,
  });
  await work.em.flush();
  const drawn = { patternId: pattern.id, number: 1, definition: {}, createdBy: 'A test' };
  const version = work.em.create(PatternVersion, { ...at, ...drawn });
  await work.em.flush();
  const quote = work.em.create(Quote, {
    ...at,
    number: `Q-${String(made).padStart(4, '0')}`,
    customerId,
    patternVersionId: version.id,
    layoutId: layout.id,
    title: 'Round coasters',
    state: 'agreed',
    agreedQuantity: 100,
    agreedHow: 'phone',
    inHandsOn: null,
    validUntil: null,
    sentAt: null,
    agreedAt: null,
    input: {},
    numbers: {},
    overrides: {},
  });
  await work.em.flush();
  return quote;
}
