import { InvalidInput } from '../errors/domain-error.ts';
import type { Outline } from '../outline/outline.ts';
import { ringBounds } from '../outline/ring.ts';
import type { Placement } from './layout.ts';
import { placedRing } from './placed-ring.ts';

/** Straight cuts that part a panel into strips which go into a press. */
export interface StripCuts {
  /** the way that the cuts run */
  along: 'width' | 'height';
  /** where they cross the other side, in mm from its beginning, rising */
  at: number[];
  /** how wide each strip becomes, in mm */
  widths: number[];
}

/**
 * The fewest straight cuts, all one way, that part a panel's layout into strips no wider than the
 * press takes, without running through a piece; null where none are needed or no such cuts exist.
 * @param widestMm what the press takes, above 0
 * @throws InvalidInput
 */
export function stripCuts(
  panel: { widthMm: number; heightMm: number },
  placements: readonly Placement[],
  outline: Outline,
  widestMm: number,
): StripCuts | null {
  if (!(widestMm > 0)) throw new InvalidInput('widestMm', 'Say how wide a strip may be.');
  const { widthMm, heightMm } = panel;
  if (placements.length === 0) return null;
  if (Math.min(widthMm, heightMm) <= widestMm) return null;
  const boxes = placements.map((placement) => ringBounds(placedRing(outline, placement)));
  const ways = [
    cutsBetween(
      'width',
      boxes.map(({ minY, maxY }) => [minY, maxY]),
      heightMm,
      widestMm,
    ),
    cutsBetween(
      'height',
      boxes.map(({ minX, maxX }) => [minX, maxX]),
      widthMm,
      widestMm,
    ),
  ];
  const found = ways.filter((way) => way !== null);
  return found.sort((a, b) => a.at.length - b.at.length)[0] ?? null;
}

type Span = [number, number];

/** Goes as far as a strip may before each cut: then there are the fewest. */
function cutsBetween(
  along: StripCuts['along'],
  spans: Span[],
  size: number,
  widest: number,
): StripCuts | null {
  const gaps = gapsBetween(spans, size);
  const at: number[] = [];
  let from = 0;
  while (size - from > widest) {
    const next = gaps
      .map(([start, end]) => Math.min((start + end) / 2, Math.max(start, from + widest)))
      .filter((cut) => cut > from && cut <= from + widest)
      .at(-1);
    if (next === undefined) return null;
    at.push(next);
    from = next;
  }
  return { along, at, widths: [...at, size].map((to, index) => to - (at[index - 1] ?? 0)) };
}

/** Where nothing lies, between the pieces and before the far edge, rising. */
function gapsBetween(spans: Span[], size: number): Span[] {
  const gaps: Span[] = [];
  let reached = 0;
  for (const [start, end] of [...spans].sort((a, b) => a[0] - b[0])) {
    if (start > reached && reached > 0) gaps.push([reached, start]);
    reached = Math.max(reached, end);
  }
  return reached < size ? [...gaps, [reached, size]] : gaps;
}
