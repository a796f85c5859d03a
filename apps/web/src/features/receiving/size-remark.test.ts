import { expect, it } from 'vitest';
import { sizeRemark } from './size-remark.ts';

const habit = { areaUnit: 'ft2', areaShown: 'tenth', lengthUnit: 'mm' } as never;
const panels = { pieces: 3, width: '300', height: '250' };

it('says what panels of a size have at most where more was measured, and nothing while it is half typed', () => {
  // 3 × 300 × 250 mm = 225,000 mm² = 2.42 ft²
  expect(sizeRemark({ ...panels, measured: '1881286.56' }, habit)).toBe(
    '3 of 300 × 250 mm are 2.4 ft² at most: look at the area, the size or the count again.',
  );
  expect(sizeRemark({ ...panels, measured: '225000' }, habit)).toBe('');
  expect(sizeRemark({ ...panels, measured: '1881286.56', width: null }, habit)).toBe('');
  expect(sizeRemark({ ...panels, measured: '1881286.56', pieces: '' }, habit)).toBe('');
});
