import { describe, expect, it } from 'vitest';
import { curveWords } from './curve-words.ts';
import { drawnOutline, holeName, openDrawing, type OpenedDrawing } from './drawn-outline.ts';

const shapes =
  '<rect width="80" height="40"/><circle cx="10" cy="20" r="3"/><rect x="60" y="10" width="4" height="20"/>';
const inMm = `<svg width="80mm" height="40mm" viewBox="0 0 80 40">${shapes}</svg>`;
const bare = `<svg viewBox="0 0 80 40">${shapes}</svg>`;

function opened(text: string): OpenedDrawing {
  const found = openDrawing('tag.svg', text);
  if (typeof found === 'string') throw new Error(found);
  return found;
}

const choice = { curve: 0, kept: {}, knownWidthMm: '' };

describe('an outline from a file', () => {
  it('is the chosen curve with the holes that are ticked', () => {
    const { outline, holes } = drawnOutline(opened(inMm), {
      ...choice,
      kept: { [holeName(2)]: true, [holeName(1)]: false },
    });
    expect(holes.map(({ id }) => id)).toEqual([2, 1]);
    expect(outline?.points).toHaveLength(4);
    expect(outline?.punched).toHaveLength(1);
  });

  it('waits for a width where the file says none, and is as wide as it then says', () => {
    const waiting = drawnOutline(opened(bare), choice);
    expect(waiting).toMatchObject({ drawing: { needsWidth: true }, chosen: { id: 0 } });
    expect(waiting.outline ?? waiting.refusal).toBeUndefined();
    const { drawing, outline } = drawnOutline(opened(bare), { ...choice, knownWidthMm: '101.6' });
    expect(drawing.closed[0]?.width).toBeCloseTo(101.6, 6);
    expect(outline?.points).toContainEqual({ x: 50.8, y: 25.4 });
    const refused = drawnOutline(opened(bare), { ...choice, knownWidthMm: 'wide' });
    expect(refused.refusal).toContain('Write the width');
    expect(refused.outline).toBeUndefined();
  });

  it('is refused with the place where it cannot be cut', () => {
    const bow = '<svg width="50mm" viewBox="0 0 50 50"><path d="M0 0L40 40L40 0L0 30z"/></svg>';
    const { outline, refusal } = drawnOutline(opened(bow), choice);
    expect(outline).toBeUndefined();
    expect(refusal).toMatch(/crosses itself near x \d+\.\d, y \d+\.\d mm/);
  });

  it('says what is wrong with a file', () => {
    expect(openDrawing('a.svg', 'nothing')).toContain('not an SVG');
    expect(openDrawing('a.svg', '<svg></svg>')).toContain('a.svg holds no curve');
    const line = '<svg width="9mm" viewBox="0 0 9 9"><path d="M1 2L3 4L8 1"/></svg>';
    expect(openDrawing('a.svg', line)).toContain('only open lines');
    expect(openDrawing('a.svg', line)).toContain('near x 1.0, y 2.0 mm');
  });

  it('has sizes in the shop’s unit once they are known', () => {
    const curve = { width: 50.8, height: 25.4 };
    expect(curveWords(curve, 'mm', 'in')).toBe('2 × 1 in');
    expect(curveWords(curve, 'mm', 'mm')).toBe('50.8 × 25.4 mm');
    expect(curveWords({ width: 300, height: 2 / 3 }, 'drawing units', 'mm')).toBe(
      '300 × 0.6667 drawing units',
    );
  });
});
