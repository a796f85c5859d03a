import type { Point } from '../outline.ts';
import { readNumbers } from './read-numbers.ts';
import { refusal } from './refusal.ts';

/** x' = a x + c y + e, y' = b x + d y + f. */
export interface Matrix {
  a: number;
  b: number;
  c: number;
  d: number;
  e: number;
  f: number;
}

export const unchanged: Matrix = { a: 1, b: 0, c: 0, d: 1, e: 0, f: 0 };

/** First `inner`, then `outer`. */
export function combined(outer: Matrix, inner: Matrix): Matrix {
  return {
    a: outer.a * inner.a + outer.c * inner.b,
    b: outer.b * inner.a + outer.d * inner.b,
    c: outer.a * inner.c + outer.c * inner.d,
    d: outer.b * inner.c + outer.d * inner.d,
    e: outer.a * inner.e + outer.c * inner.f + outer.e,
    f: outer.b * inner.e + outer.d * inner.f + outer.f,
  };
}

export const moved = ({ a, b, c, d, e, f }: Matrix, { x, y }: Point): Point => ({
  x: a * x + c * y + e,
  y: b * x + d * y + f,
});

/** The most by which it lengthens anything: the larger singular value. */
export function largestScale({ a, b, c, d }: Matrix): number {
  const [sum, difference] = [Math.hypot(a + d, b - c), Math.hypot(a - d, b + c)];
  return (sum + difference) / 2;
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;
const shift = (e: number, f: number): Matrix => ({ ...unchanged, e, f });

function turn(degrees: number): Matrix {
  const [cos, sin] = [Math.cos(radians(degrees)), Math.sin(radians(degrees))];
  return { a: cos, b: sin, c: -sin, d: cos, e: 0, f: 0 };
}

const functions: Record<string, (numbers: number[]) => Matrix | null> = {
  matrix: ([a, b, c, d, e, f]) =>
    f === undefined ? null : ({ a, b, c, d, e, f } as Record<keyof Matrix, number>),
  translate: ([x = 0, y = 0]) => shift(x, y),
  scale: ([x = 1, y = x]) => ({ ...unchanged, a: x, d: y }),
  rotate: ([degrees = 0, x = 0, y = 0]) =>
    combined(combined(shift(x, y), turn(degrees)), shift(-x, -y)),
  skewX: ([degrees = 0]) => ({ ...unchanged, c: Math.tan(radians(degrees)) }),
  skewY: ([degrees = 0]) => ({ ...unchanged, b: Math.tan(radians(degrees)) }),
};

/** A `transform` attribute. @throws InvalidInput where it cannot be read */
export function readTransform(text: string): Matrix {
  if (text.length > 2000) throw refusal('A transform of the drawing is too long to be read.');
  let matrix = unchanged;
  const rest = text.replaceAll(
    /([a-zA-Z]+)\s*\(([^()]*)\)\s*,?/g,
    (_, name: string, list: string) => {
      const numbers = readNumbers(list);
      const next = numbers && functions[name]?.(numbers);
      if (!next) throw refusal(`The transform “${text.slice(0, 60)}” cannot be read.`);
      matrix = combined(matrix, next);
      return '';
    },
  );
  if (rest.trim() === '' || rest.trim() === 'none') return matrix;
  throw refusal(`The transform “${text.slice(0, 60)}” cannot be read.`);
}
