import type { Hardware, Leather } from '@hidewright/contract';
import type { Choice } from '../../../components/select-field.tsx';
import type { Goods } from '../../../features/purchase-orders/typed-order.ts';

interface Named {
  id: number;
  name: string;
  active: boolean;
}

/** What is still in use, by name, as a list to choose from. */
export function choicesOf(things: readonly Named[]): Choice[] {
  return inUse(things).map(({ id, name }) => ({ value: id, label: name }));
}

export function leatherGoods(leathers: readonly Leather[]): Goods[] {
  return inUse(leathers).map(({ id, name, pricePerFt2 }) => ({ id, name, price: pricePerFt2 }));
}

/** What is bought: a kit is bought by its parts, and what the customer brings is not bought at all. */
export function hardwareGoods(hardware: readonly Hardware[]): Goods[] {
  return inUse(hardware)
    .filter(({ parts, fromCustomer }) => parts.length === 0 && !fromCustomer)
    .map(({ id, name, unitPrice, packSize, unit }) => ({
      ...{ id, name, packSize, unit },
      price: unitPrice,
    }));
}

function inUse<Thing extends Named>(things: readonly Thing[]): Thing[] {
  return things.filter((thing) => thing.active).sort((a, b) => a.name.localeCompare(b.name, 'en'));
}
