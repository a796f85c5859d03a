import { describe, expect, it } from 'vitest';
import { carried, fitted, frameOf, movedBy, photoBox, trueToScale } from './side-photo.ts';

const size = { widthPx: 400, heightPx: 200 };
const photo = {
  ...size,
  ...fitted(size, { x: 0, y: 0, width: 2000, height: 900 }),
  url: 'blob:1',
  source: { hash: 'a' },
};
const middleOf = (box: ReturnType<typeof photoBox>) => [
  box.x + box.width / 2,
  box.y + box.height / 2,
];

describe('a photo under a drawing', () => {
  it('covers the edge until its scale is known', () => {
    expect(photoBox(photo)).toEqual({ x: 0, y: -50, width: 2000, height: 1000 });
  });

  it('gets the scale that a line of known length tells, about its middle', () => {
    // 300 mm as it lies, so 60 pixels, which are one metre in truth.
    const line = [
      { x: 100, y: 100 },
      { x: 100, y: 400 },
    ] as const;
    const scaled = trueToScale(photo, line, 1000)!;
    expect(scaled.mmPerPixel).toBeCloseTo(1000 / 60, 9);
    expect(middleOf(photoBox(scaled))).toEqual(middleOf(photoBox(photo)));
    const [from, to] = carried(line, photo, scaled);
    expect(Math.hypot(to!.x - from!.x, to!.y - from!.y)).toBeCloseTo(1000, 6);
    expect(trueToScale(photo, [line[0], { x: 120, y: 100 }], 1000)).toBeUndefined();
  });

  it('is in sight whole, with the edge, wherever it is moved', () => {
    const moved = movedBy(photo, -500, 20);
    const outline = [
      { x: 0, y: 0 },
      { x: 2000, y: 900 },
    ];
    expect(frameOf(outline, moved)).toEqual({ x: -500, y: -30, width: 2500, height: 1000 });
    expect(frameOf(outline, undefined)).toEqual({ x: 0, y: 0, width: 2000, height: 900 });
  });
});
