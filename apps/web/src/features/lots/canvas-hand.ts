import type { Point } from '@hidewright/domain';
import type { KeyboardEvent, PointerEvent } from 'react';

const directions: Record<string, [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

/** How far an arrow key goes on a drawing, in mm: further with Shift held. Undefined for another key. */
export function strideOf(event: KeyboardEvent): Point | undefined {
  const direction = directions[event.key];
  if (!direction) return undefined;
  const by = event.shiftKey ? 50 : 10;
  return { x: direction[0] * by, y: direction[1] * by };
}

/** Where on a drawing mouse or finger is, in its own units. */
export function placeOn(svg: SVGSVGElement | null, { clientX, clientY }: PointerEvent): Point {
  const matrix = svg?.getScreenCTM();
  if (!matrix) return { x: 0, y: 0 };
  const { x, y } = new DOMPoint(clientX, clientY).matrixTransform(matrix.inverse());
  return { x, y };
}

export const sumOf = (a: Point, b: Point): Point => ({ x: a.x + b.x, y: a.y + b.y });
