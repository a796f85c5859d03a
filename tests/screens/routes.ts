import type { Role } from '../support/steps.ts';

export interface Screen {
  /** The file it is drawn to, without role and width. */
  name: string;
  path: string;
}

interface Found {
  items: { id: number; state?: string }[];
}

/** Reads as whoever is signed in in the page. */
export type Read = (address: string) => Promise<Found>;

const everybody: Screen[] = [{ name: 'today', path: '/today' }];

const byRole: Record<Role, Screen[]> = {
  owner: [
    { name: 'quotes', path: '/counter/quotes' },
    { name: 'quote-new', path: '/counter/quotes/new' },
    { name: 'orders', path: '/counter/orders' },
    { name: 'customers', path: '/counter/customers' },
    { name: 'customer-new', path: '/counter/customers/new' },
    { name: 'patterns', path: '/pattern-room/patterns' },
    { name: 'pattern-new', path: '/pattern-room/patterns/new' },
    { name: 'tooling', path: '/pattern-room/tooling' },
    { name: 'tool-new', path: '/pattern-room/tooling/new' },
    { name: 'presses', path: '/pattern-room/presses' },
    { name: 'machine-pays', path: '/pattern-room/presses/pays' },
    { name: 'bench', path: '/bench' },
    { name: 'week-mix', path: '/bench/week-mix' },
    { name: 'checks', path: '/bench/checks' },
    { name: 'leather', path: '/stockroom/leather' },
    { name: 'lots', path: '/stockroom/lots' },
    { name: 'hardware', path: '/stockroom/hardware' },
    { name: 'finished-pieces', path: '/stockroom/finished' },
    { name: 'put-on-shelf', path: '/stockroom/finished/new' },
    { name: 'suppliers', path: '/stockroom/suppliers' },
    { name: 'to-order', path: '/stockroom/to-order' },
    { name: 'to-order-all', path: '/stockroom/to-order?show=all' },
    { name: 'purchase-orders', path: '/stockroom/purchase-orders' },
    { name: 'purchase-order-new', path: '/stockroom/purchase-orders/new' },
    { name: 'receive', path: '/stockroom/receive' },
    { name: 'deliveries', path: '/stockroom/deliveries' },
    { name: 'scan', path: '/stockroom/scan' },
    { name: 'counts', path: '/stockroom/counts' },
    { name: 'tags', path: '/stockroom/tags' },
    { name: 'on-hand', path: '/stockroom/on-hand' },
    { name: 'ledger', path: '/stockroom/ledger' },
    { name: 'invoices', path: '/books/invoices' },
    { name: 'office', path: '/office' },
    { name: 'people', path: '/office/people' },
    { name: 'log', path: '/office/log' },
    { name: 'not-found', path: '/nowhere' },
  ],
  maker: [
    { name: 'bench', path: '/bench' },
    { name: 'checks', path: '/bench/checks' },
    { name: 'patterns', path: '/pattern-room/patterns' },
    { name: 'tooling', path: '/pattern-room/tooling' },
    { name: 'leather', path: '/stockroom/leather' },
    { name: 'lots', path: '/stockroom/lots' },
    { name: 'hardware', path: '/stockroom/hardware' },
    { name: 'finished-pieces', path: '/stockroom/finished' },
    { name: 'put-on-shelf', path: '/stockroom/finished/new' },
    { name: 'to-order', path: '/stockroom/to-order' },
    { name: 'purchase-orders', path: '/stockroom/purchase-orders' },
    { name: 'receive', path: '/stockroom/receive' },
    { name: 'scan', path: '/stockroom/scan' },
    { name: 'counts', path: '/stockroom/counts' },
    { name: 'tags', path: '/stockroom/tags' },
    { name: 'on-hand', path: '/stockroom/on-hand' },
    { name: 'ledger', path: '/stockroom/ledger' },
  ],
  bookkeeper: [
    { name: 'quotes', path: '/counter/quotes' },
    { name: 'orders', path: '/counter/orders' },
    { name: 'customers', path: '/counter/customers' },
    { name: 'invoices', path: '/books/invoices' },
    { name: 'owed', path: '/books/owed' },
    { name: 'payments', path: '/books/payments' },
    { name: 'sales-sheets', path: '/books/sales-sheets' },
    { name: 'tax', path: '/books/tax' },
  ],
};

/** Lists whose rows have a page of their own: one screen for each state that is there. */
const lists: { name: string; list: string; page: (id: number) => string; roles: Role[] }[] = [
  {
    name: 'quote',
    list: '/quotes',
    page: (id) => `/counter/quotes/${id}`,
    roles: ['owner', 'bookkeeper'],
  },
  {
    name: 'quote-workings',
    list: '/quotes',
    page: (id) => `/counter/quotes/${id}/workings`,
    roles: ['owner'],
  },
  {
    name: 'order',
    list: '/orders',
    page: (id) => `/counter/orders/${id}`,
    roles: ['owner', 'bookkeeper'],
  },
  { name: 'job', list: '/jobs', page: (id) => `/bench/jobs/${id}`, roles: ['owner', 'maker'] },
  {
    name: 'check',
    list: '/quotes?state=agreed',
    page: (id) => `/bench/checks/${id}`,
    roles: ['maker'],
  },
  {
    name: 'customer',
    list: '/customers',
    page: (id) => `/counter/customers/${id}`,
    roles: ['owner'],
  },
  {
    name: 'pattern',
    list: '/patterns',
    page: (id) => `/pattern-room/patterns/${id}`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'cut-from',
    list: '/patterns',
    page: (id) => `/pattern-room/patterns/${id}/cut-from`,
    roles: ['owner'],
  },
  {
    name: 'learned',
    list: '/patterns',
    page: (id) => `/pattern-room/patterns/${id}/learned`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'time-step',
    list: '/patterns',
    page: (id) => `/pattern-room/patterns/${id}/time`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'tooling-for',
    list: '/patterns',
    page: (id) => `/pattern-room/patterns/${id}/tooling?pieces=500&runs=3`,
    roles: ['owner'],
  },
  {
    name: 'pattern-change',
    list: '/patterns',
    page: (id) => `/pattern-room/patterns/${id}/change`,
    roles: ['owner'],
  },
  {
    name: 'tool',
    list: '/tools',
    page: (id) => `/pattern-room/tooling/${id}`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'leather-one',
    list: '/leathers',
    page: (id) => `/stockroom/leather/${id}`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'count',
    list: '/counts',
    page: (id) => `/stockroom/counts/${id}`,
    roles: ['owner', 'maker'],
  },
  { name: 'lot', list: '/lots', page: (id) => `/stockroom/lots/${id}`, roles: ['owner', 'maker'] },
  {
    name: 'ledger-of-job',
    list: '/jobs',
    page: (id) => `/stockroom/ledger?job=${id}`,
    roles: ['owner'],
  },
  {
    name: 'hardware-one',
    list: '/hardware',
    page: (id) => `/stockroom/hardware/${id}`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'finished-piece',
    list: '/finished-pieces',
    page: (id) => `/stockroom/finished/${id}`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'sell-finished',
    list: '/finished-pieces?there=yes',
    page: (id) => `/stockroom/finished/${id}/sell`,
    roles: ['owner'],
  },
  {
    name: 'supplier',
    list: '/suppliers',
    page: (id) => `/stockroom/suppliers/${id}`,
    roles: ['owner'],
  },
  {
    name: 'purchase-order',
    list: '/purchase-orders',
    page: (id) => `/stockroom/purchase-orders/${id}`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'purchase-order-of-work',
    list: '/lots?onRack=yes',
    page: (id) => `/stockroom/purchase-orders/new?lot=${id}`,
    roles: ['owner'],
  },
  {
    name: 'receive-order',
    list: '/purchase-orders?awaited=yes',
    page: (id) => `/stockroom/receive?order=${id}`,
    roles: ['owner', 'maker'],
  },
  {
    name: 'invoice',
    list: '/invoices',
    page: (id) => `/books/invoices/${id}`,
    roles: ['owner', 'bookkeeper'],
  },
];

/** Every screen that a role has, in every state that the demo shows. */
export async function screensOf(role: Role, read: Read): Promise<Screen[]> {
  const screens = [...everybody, ...byRole[role]];
  for (const { name, list, page, roles } of lists) {
    if (!roles.includes(role)) continue;
    const states = new Map<string, number>();
    for (const { id, state } of (await read(list)).items) {
      if (!states.has(state ?? '')) states.set(state ?? '', id);
    }
    for (const [state, id] of states) {
      screens.push({
        name: [name, state.replaceAll(' ', '-')].filter(Boolean).join('-'),
        path: page(id),
      });
    }
  }
  return screens;
}
