import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';

/** "T-0012 and T-0014" of what an order has worked on; empty where it orders goods alone. */
export function lotsOf({ lines }: PurchaseOrder): string {
  const tags = new Set(lines.flatMap(({ service }) => service?.lotTag ?? []));
  return [...tags].join(' and ');
}

/** Where leather is that a line has worked on, once it is not awaited. */
export function whereItIs({ service }: PurchaseLine): string | undefined {
  if (service?.state === 'came back') return 'came back';
  return service?.state === 'put back' ? `back on ${service.lotTag}, not done` : undefined;
}
