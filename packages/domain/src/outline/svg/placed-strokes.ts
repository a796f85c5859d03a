import type { Element } from './read-elements.ts';
import { type HiddenBySheet, hiddenBySheets, isHidden } from './hidden.ts';
import { userUnits } from './lengths.ts';
import { combined, type Matrix, readTransform, unchanged } from './matrix.ts';
import { deepest, mostElements, refusal } from './refusal.ts';
import { isShare, shapeStrokes } from './shape-strokes.ts';
import type { Stroke } from './stroke.ts';
import { innerViewport } from './viewport.ts';

/** A stroke and where it lies in the drawing. */
export interface PlacedStroke {
  stroke: Stroke;
  matrix: Matrix;
}

export interface Drawn {
  strokes: PlacedStroke[];
  /** elements of lettering, which have no curves of their own */
  texts: number;
  /** shapes measured in per cent, such as a background */
  shares: number;
}

const groups = new Set(['svg', 'g', 'a', 'switch']);

interface Walk extends Drawn {
  byId: ReadonlyMap<string, Element>;
  hidden: HiddenBySheet;
  visited: number;
}

/**
 * Everything that a drawing shows, with the transforms of all the groups around it; what is only
 * defined, hidden, or clips something is left out.
 * @throws InvalidInput for `drawing`
 */
export function placedStrokes(root: Element): Drawn {
  const walk: Walk = {
    strokes: [],
    texts: 0,
    shares: 0,
    byId: elementsById(root),
    hidden: hiddenBySheets(root),
    visited: 0,
  };
  root.children.forEach((child) => visit(walk, child, unchanged, 0));
  const { strokes, texts, shares } = walk;
  return { strokes, texts, shares };
}

function elementsById(root: Element): Map<string, Element> {
  const byId = new Map<string, Element>();
  const waiting = [root];
  for (let element = waiting.pop(); element; element = waiting.pop()) {
    const id = element.attributes.get('id');
    if (id !== undefined) byId.set(id, element);
    waiting.push(...element.children);
  }
  return byId;
}

function visit(walk: Walk, element: Element, outer: Matrix, depth: number): void {
  walk.visited += 1;
  if (depth > deepest || walk.visited > mostElements) {
    throw refusal('The drawing repeats its parts too often. Save it with its copies unlinked.');
  }
  if (isHidden(element, walk.hidden)) return;
  const matrix = placeOf(element, outer);
  if (element.name === 'text') walk.texts += 1;
  else if (element.name === 'use') visitUse(walk, element, matrix, depth);
  else if (groups.has(element.name)) {
    const inner = element.name === 'svg' ? combined(matrix, innerPlace(element)) : matrix;
    element.children.forEach((child) => visit(walk, child, inner, depth + 1));
  } else if (isShare(element)) walk.shares += 1;
  else shapeStrokes(element).forEach((stroke) => walk.strokes.push({ stroke, matrix }));
}

function placeOf({ attributes }: Element, outer: Matrix): Matrix {
  const transform = attributes.get('transform');
  return transform === undefined ? outer : combined(outer, readTransform(transform));
}

function innerPlace(svg: Element): Matrix {
  const shift = { ...unchanged, e: userUnits(svg, 'x'), f: userUnits(svg, 'y') };
  const { attributes } = svg;
  return combined(shift, innerViewport(svg, attributes.get('width'), attributes.get('height')));
}

/** A copy of another part; a symbol is fitted into the size that the copy gives it. */
function visitUse(walk: Walk, use: Element, outer: Matrix, depth: number): void {
  const { attributes } = use;
  const name = (attributes.get('href') ?? attributes.get('xlink:href') ?? '').trim().slice(1);
  const target = walk.byId.get(name);
  if (!target) return;
  const shift = { ...unchanged, e: userUnits(use, 'x'), f: userUnits(use, 'y') };
  const matrix = combined(outer, shift);
  if (target.name !== 'symbol') {
    visit(walk, target, matrix, depth + 1);
    return;
  }
  if (isHidden(target, walk.hidden)) return;
  const viewport = innerViewport(target, attributes.get('width'), attributes.get('height'));
  const inner = combined(placeOf(target, matrix), viewport);
  target.children.forEach((child) => visit(walk, child, inner, depth + 1));
}
