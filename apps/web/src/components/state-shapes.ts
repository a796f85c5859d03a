export type StateShape = 'hollow' | 'half' | 'full' | 'check' | 'cross' | 'dash' | 'wait' | 'arrow';
export type StateTone = 'quiet' | 'act' | 'attention' | 'danger' | 'info';

type Look = readonly [StateShape, StateTone];

/** Every state of quotes, orders, jobs, purchase orders, invoices and lots: its shape tells it as well as its colour. */
export const stateLooks: Readonly<Record<string, Look>> = {
  draft: ['hollow', 'quiet'],
  sent: ['arrow', 'info'],
  agreed: ['check', 'act'],
  declined: ['cross', 'quiet'],
  superseded: ['dash', 'quiet'],
  lapsed: ['dash', 'attention'],
  'awaiting proof': ['wait', 'attention'],
  'awaiting deposit': ['wait', 'attention'],
  'awaiting tooling': ['wait', 'attention'],
  'taken on': ['full', 'act'],
  'in work': ['half', 'info'],
  packed: ['full', 'info'],
  'part shipped': ['half', 'info'],
  shipped: ['arrow', 'act'],
  closed: ['check', 'quiet'],
  cancelled: ['cross', 'quiet'],
  waiting: ['wait', 'attention'],
  ready: ['hollow', 'act'],
  'at the bench': ['half', 'info'],
  paused: ['dash', 'attention'],
  finished: ['check', 'act'],
  'part received': ['half', 'info'],
  received: ['check', 'act'],
  issued: ['arrow', 'info'],
  'part paid': ['half', 'info'],
  paid: ['check', 'act'],
  credited: ['dash', 'quiet'],
  late: ['cross', 'danger'],
  overdue: ['cross', 'danger'],
  short: ['cross', 'danger'],
  open: ['hollow', 'act'],
  locked: ['check', 'quiet'],
};
