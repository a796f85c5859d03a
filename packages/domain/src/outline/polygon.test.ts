import { expect, it } from 'vitest';
import { findCrossing } from './crossing.ts';
import { outlinePolygon } from './polygon.ts';

it('leaves no edge that runs back on another where two roundings meet', () => {
  const polygon = outlinePolygon({
    shape: 'tag',
    lengthMm: 33.75,
    widthMm: 15,
    neckLengthMm: 23.625,
    neckWidthMm: 2.25,
    cornerRadiusMm: 5.0625,
  });
  expect(findCrossing([polygon])).toBeNull();
});
