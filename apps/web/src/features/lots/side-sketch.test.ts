import { describe, expect, it } from 'vitest';
import {
  roundFlaw,
  withCorner,
  withFlawClosed,
  withoutFlaw,
  type SideSketch,
} from './side-sketch.ts';

const blank: SideSketch = { outline: [], flaws: [], underWay: [] };
const draw = (...points: [number, number][]) =>
  points.reduce((sketch, [x, y]) => withCorner(sketch, { x, y }), blank);

describe('a flaw being drawn', () => {
  it('keeps corners that moved on, in whole mm, and is closed', () => {
    const sketch = draw([0, 0], [2, 2], [30.4, 0], [30, 40]);
    expect(sketch.underWay).toEqual([
      { x: 0, y: 0 },
      { x: 30, y: 0 },
      { x: 30, y: 40 },
    ]);
    const closed = withFlawClosed(sketch, 50);
    expect(closed).toMatchObject({ flaws: [sketch.underWay], underWay: [] });
    expect(withoutFlaw(closed, 0).flaws).toEqual([]);
  });

  it('becomes a round one when it was a tap, and nothing when nothing was drawn', () => {
    expect(withFlawClosed(draw([100, 100]), 50).flaws).toEqual([roundFlaw({ x: 100, y: 100 }, 50)]);
    expect(withFlawClosed(blank, 50)).toBe(blank);
  });
});
