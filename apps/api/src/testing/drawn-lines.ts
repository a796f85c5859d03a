import { inflateSync } from 'node:zlib';

export interface DrawnLine {
  from: [number, number];
  to: [number, number];
}

type Matrix = readonly [number, number, number, number, number, number];

/** For the tests: every stretch that a PDF's pages draw, curves from end to end, in points as a printer gets them. */
export function drawnLines(pdf: Uint8Array): DrawnLine[] {
  return pageContents(Buffer.from(pdf)).flatMap(linesOf);
}

export function pageCount(pdf: Uint8Array): number {
  return (
    Buffer.from(pdf)
      .toString('latin1')
      .match(/\/Type \/Page\b(?!s)/g)?.length ?? 0
  );
}

/** Fonts are streams too; only what draws holds a transformation or a path. */
function pageContents(pdf: Buffer): string[] {
  const text = pdf.toString('latin1');
  return [...text.matchAll(/stream\r?\n([\s\S]*?)\r?\nendstream/g)].flatMap(([, bytes = '']) => {
    try {
      const content = inflateSync(Buffer.from(bytes, 'latin1')).toString('latin1');
      return / (?:cm|re|m)\n/.test(content) && !content.includes('begincmap') ? [content] : [];
    } catch {
      return [];
    }
  });
}

function linesOf(content: string): DrawnLine[] {
  const lines: DrawnLine[] = [];
  const kept: Matrix[] = [];
  let matrix: Matrix = [1, 0, 0, 1, 0, 0];
  let here: [number, number] = [0, 0];
  for (const line of content.split('\n')) {
    const words = line.trim().split(/\s+/);
    const command = words.pop();
    const numbers = words.map(Number);
    if (command === 'q') kept.push(matrix);
    else if (command === 'Q') matrix = kept.pop() ?? matrix;
    else if (command === 'cm') matrix = combined(matrix, numbers as unknown as Matrix);
    else if (command === 'm' || command === 'l' || command === 'c') {
      const to = placed(matrix, numbers.at(-2) ?? 0, numbers.at(-1) ?? 0);
      if (command !== 'm') lines.push({ from: here, to });
      here = to;
    }
  }
  return lines;
}

function combined(outer: Matrix, [a, b, c, d, e, f]: Matrix): Matrix {
  const [left, top] = placed(outer, e, f);
  const [A, B, C, D] = outer;
  return [A * a + C * b, B * a + D * b, A * c + C * d, B * c + D * d, left, top];
}

const placed = ([a, b, c, d, e, f]: Matrix, x: number, y: number): [number, number] => [
  a * x + c * y + e,
  b * x + d * y + f,
];
