import { scaled } from '../../db/columns/scaled-decimal.ts';
import type { Hardware } from '../../modules/hardware/hardware.entity.ts';
import type { Leather } from '../../modules/leathers/leather.entity.ts';
import type { BoughtRow } from '../order-suggestions/item-terms.ts';

export function boughtLeather(leather: Leather): BoughtRow {
  const { id, pricePerFt2, supplierId, wholeForm, wholeAreaMm2 } = leather;
  return {
    ...{ of: 'leather', id, pack_size: 1, supplier_id: supplierId },
    price: scaled(pricePerFt2, 4),
    whole_area: wholeForm === null || wholeAreaMm2 === null ? null : scaled(wholeAreaMm2, 3),
  };
}

export function boughtHardware(kind: Hardware): BoughtRow {
  const { id, unitPrice, packSize, supplierId } = kind;
  return {
    ...{ of: 'hardware', id, pack_size: packSize, supplier_id: supplierId },
    price: scaled(unitPrice, 4),
    whole_area: null,
  };
}
