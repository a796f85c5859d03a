import { describe, expect, it } from 'vitest';
import { usualOffer } from './supplier-offer.ts';

const offer = (supplierId: number, preferred = false) => ({ supplierId, preferred });

describe('by which offer a thing is bought', () => {
  it.each([
    ['the preferred, whomever it names', [offer(1), offer(2, true)], 1, 2],
    ['that of the supplier whom it names', [offer(1), offer(2)], 2, 2],
    ['the first where it names nobody', [offer(1), offer(2)], null, 1],
    ['none where those are of others', [offer(1)], 2, undefined],
    ['none where there are none', [], null, undefined],
  ])('%s', (_rule, offers, named, bought) => {
    expect(usualOffer(offers, named)?.supplierId).toBe(bought);
  });
});
