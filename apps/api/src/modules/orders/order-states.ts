import type { Awaited, OrderState } from '@hidewright/contract';

const inOrder: readonly Awaited[] = ['proof', 'deposit', 'tooling'];

/** The state of an order on which nobody works yet, by the first thing that it still awaits. */
export function stateAwaiting(awaits: readonly Awaited[]): OrderState {
  const first = inOrder.find((what) => awaits.includes(what));
  return first === undefined ? 'taken on' : `awaiting ${first}`;
}

export const isAwaiting = (state: OrderState): boolean => state.startsWith('awaiting');

/** In the order in which they are usually had. */
export const sortAwaits = (awaits: readonly Awaited[]): Awaited[] =>
  inOrder.filter((what) => awaits.includes(what));

const nextSteps: Record<OrderState, string[]> = {
  'awaiting proof': ['note what has arrived'],
  'awaiting deposit': ['note what has arrived'],
  'awaiting tooling': ['note what has arrived'],
  'taken on': ['work its ticket'],
  'in work': ['finish its ticket'],
  packed: ['ship it'],
  'part shipped': ['ship the rest'],
  shipped: ['invoice it'],
  closed: [],
  cancelled: [],
};

/** What an order's state allows, in words. */
export const allowedFor = (state: OrderState): string[] => nextSteps[state];

const arrivals: Record<Awaited, string> = {
  proof: 'proof approved',
  deposit: 'deposit received',
  tooling: 'tooling here',
};

/** How people say that what was awaited has come. */
export const arrivalWords = (what: Awaited): string => arrivals[what];
