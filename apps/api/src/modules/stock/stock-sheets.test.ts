import { stockLevels } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { Workshop } from '../workshop/workshop.entity.ts';
import { levelsSheet } from './stock-sheets.ts';

const workshop = Object.assign(new Workshop(), {
  name: 'Marlpit Leatherworks',
  areaUnit: 'ft2' as const,
  currency: 'USD',
});

const levels = stockLevels.parse({
  on: '2026-12-02',
  leathers: [],
  hardware: [],
  kits: [],
  leatherAreaMm2: '0',
  leatherValue: '0.00',
  hardwareValue: '0.00',
  out: [
    {
      lotId: 5,
      tag: 'T-0005',
      leatherName: 'Oak tan',
      service: 'dyeing',
      supplierName: 'Fenside Dye Works',
      purchaseOrderNumber: 'P-0011',
      areaMm2: '929030.4',
      value: '90.00',
    },
  ],
  outAreaMm2: '929030.4',
  outValue: '90.00',
  value: '0.00',
});

describe('what was on hand, as a spreadsheet', () => {
  it('has a page for the leather that was out', () => {
    const { pages } = levelsSheet(workshop, levels, true);
    expect(pages.map(({ name }) => name)).toEqual([
      'Leather in all 2026-12-02',
      'Leather 2026-12-02',
      'Hardware 2026-12-02',
      'Out 2026-12-02',
    ]);
    expect(pages[3]?.rows).toEqual([
      ['Oak tan', 'T-0005', 'dyeing', 'Fenside Dye Works', 'P-0011', '10', '90.00'],
    ]);
  });

  it('leaves the costs out for the maker, and the page where nothing was out', () => {
    const { pages } = levelsSheet(workshop, levels, false);
    expect(pages[3]?.rows[0]).not.toContain('90.00');
    expect(levelsSheet(workshop, { ...levels, out: [] }, true).pages).toHaveLength(3);
  });
});
