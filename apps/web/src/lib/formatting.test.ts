import { describe, expect, it } from 'vitest';
import {
  askedPriceText,
  areaText,
  dayText,
  hoursText,
  instantText,
  longDayText,
  moneyText,
  percentText,
  sizeText,
  unitPriceText,
} from './formatting.ts';

describe('figures on the screen', () => {
  it('groups money without passing it through a floating-point number', () => {
    expect(moneyText('123456789012.34')).toBe('123,456,789,012.34');
    expect(moneyText('420')).toBe('420.00');
    expect(moneyText('-1234.5')).toBe('−1,234.50');
  });

  it('shows a unit price with two decimals, or as many as it has', () => {
    expect(unitPriceText('4.2')).toBe('4.20');
    expect(unitPriceText('0.1725')).toBe('0.1725');
  });

  it('says of a price of 0 that it is not known', () => {
    expect(askedPriceText('4.2')).toBe('4.20');
    expect(askedPriceText('9.5', 'dm2')).toBe('1.0226');
    expect([askedPriceText('0'), askedPriceText('0.00', 'ft2')]).toEqual([
      'not known',
      'not known',
    ]);
  });

  it('names units', () => {
    expect(areaText('2299350.24', 'ft2')).toBe('24.75 ft²');
    expect(sizeText('279.4', '330.2', 'in')).toBe('11 × 13 in');
    expect(sizeText('279.4', '330.2', 'mm')).toBe('279.4 × 330.2 mm');
    expect(hoursText('186')).toBe('3.1 h');
    expect(percentText('7.25')).toBe('7.3\u202f%');
  });
});

describe('days', () => {
  it('says the weekday, and the year only where it is another', () => {
    expect(dayText('2026-12-14', '2026-12-01')).toBe('Mon 14 Dec');
    expect(dayText('2025-12-14', '2026-12-01')).toBe('Sun 14 Dec 2025');
    expect(longDayText('2026-12-01')).toBe('Tuesday 1 December');
  });

  it('shows an instant on the day it was in the workshop', () => {
    expect(instantText('2026-12-01T23:30:00.000Z', 'Europe/Berlin')).toBe('Wed 2 Dec, 00:30');
    expect(instantText('2026-12-01T23:30:00.000Z', 'UTC')).toBe('Tue 1 Dec, 23:30');
    expect(instantText('2025-12-31T23:30:00.000Z', 'UTC', '2026-12-01')).toBe(
      'Wed 31 Dec 2025, 23:30',
    );
    expect(instantText('2025-12-31T23:30:00.000Z', 'Europe/Berlin', '2026-12-01')).toBe(
      'Thu 1 Jan, 00:30',
    );
  });
});
