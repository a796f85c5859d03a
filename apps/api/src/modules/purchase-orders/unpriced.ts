import type { PurchaseLine } from '@hidewright/contract';
import { isPriceKnown } from '@hidewright/domain';

/** Whether goods are ordered whose price nobody knows: the supplier is asked for it. */
export const isUnpriced = ({ service, unitPrice = '0.00' }: PurchaseLine): boolean =>
  service === null && !isPriceKnown(unitPrice);
