import { expect, it } from 'vitest';
import { blankPaper, bytesOf } from './paper.ts';
import { lineSize } from './label-sheet-pdf.ts';

it.each([20, 28, 44, 48])('a tag of %d mm holds all of its lines', async (heightMm) => {
  const paper = blankPaper('Tags', 'A shop', new Date('2026-12-01T12:00:00Z'));
  for (const lines of [1, 2, 3]) {
    const size = lineSize(heightMm, lines);
    const heights = [1.6, 1, ...Array.from({ length: lines }, () => 0.9)].map((share) => {
      paper.font('plain').fontSize(size * share);
      return paper.currentLineHeight();
    });
    const inside = ((heightMm - 5) * 72) / 25.4;
    expect(heights.reduce((sum, each) => sum + each, 0)).toBeLessThanOrEqual(inside);
  }
  await bytesOf(paper);
});
