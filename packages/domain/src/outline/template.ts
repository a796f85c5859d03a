import { outlineBounds } from './measure.ts';
import type { Bounds, Outline, Point } from './outline.ts';
import { linePath, outlinePath } from './outline-path.ts';
import { safeLine } from './safe-line.ts';

export interface TemplateOptions {
  /** the pattern's name, as it is to stand on the template */
  name: string;
  /** how far artwork is to stay from every cut, 0.1 to 100 mm */
  safeMarginMm: number;
}

/** Around the outline, in mm: room for the words, and so that no printer cuts it off. */
const border = 15;
/** As wide as both rulers beside each other. */
const leastWidth = 120;

const inch = 25.4;

/**
 * The outline as an SVG drawing true to size: the cut with the holes punched with it, the line within
 * which artwork is safe, the spine's direction, and rulers of 50 mm and 2 in to check a print by. The
 * outline's middle is the drawing's origin, as in a layout.
 * @throws InvalidInput
 */
export function templateSvg(outline: Outline, { name, safeMarginMm }: TemplateOptions): string {
  const page = pageOf(outlineBounds(outline));
  const title = escaped(name);
  const safe = safeLine(outline, safeMarginMm).map(linePath).join(' ');
  const size = `width="${mm(page.width)}mm" height="${mm(page.height)}mm"`;
  const view = [page.minX, page.minY, page.width, page.height].map(mm).join(' ');
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<svg xmlns="http://www.w3.org/2000/svg" ${size} viewBox="${view}" fill="none" stroke="#000" stroke-width="0.2">`,
    `<title>${title}: template, true to size</title>`,
    `<path id="cut" d="${outlinePath(outline)}"/>`,
    ...(safe === '' ? [] : [safePath(safe)]),
    ...spine(page),
    ...rulers(page),
    `<g fill="#000" stroke="none" font-family="sans-serif" font-size="3">`,
    words(page.minX + 5, page.minY + 6, title, titleHeight(page, name)),
    words(page.minX + 5, page.minY + 10.5, 'True to size: print at 100 %, not fitted to the page.'),
    ...(safe === '' ? [] : [safeWords(page, safeMarginMm)]),
    words(page.minX + 6, page.maxY - 2, '50 mm'),
    words(page.minX + 62, page.maxY - 2, '2 in'),
    '</g>',
    '</svg>',
    '',
  ].join('\n');
}

interface Page extends Bounds {
  width: number;
  height: number;
}

/** The border, and room for rulers and words below. */
function pageOf({ minX, minY, maxX, maxY }: Bounds): Page {
  const width = Math.max(leastWidth, maxX - minX + 2 * border);
  const middle = (minX + maxX) / 2;
  const [top, bottom] = [minY - border, maxY + border + 10];
  return {
    minX: middle - width / 2,
    maxX: middle + width / 2,
    minY: top,
    maxY: bottom,
    width,
    height: bottom - top,
  };
}

const safePath = (path: string): string =>
  `<path id="safe" stroke-dasharray="2 1" stroke="#555" d="${path}"/>`;

const safeWords = ({ minX, maxY }: Page, marginMm: number): string =>
  words(minX + 5, maxY - 12, `Dashed: keep artwork ${mm(marginMm)} mm from the cut.`);

/** A letter is about 0.6 of its height wide; the spine's arrow stands to the right. */
const titleHeight = ({ width }: Page, { length }: string): number =>
  Math.min(4, Math.round((width - 38) / (0.06 * length)) / 10);

/** Along x, as pieces lie in a layout before they are turned. */
function spine({ maxX, minY }: Page): string[] {
  const [tip, y] = [maxX - 6, minY + 5];
  return [
    `<path id="spine" d="M ${mm(tip - 20)} ${mm(y)} H ${mm(tip)} M ${mm(tip - 3)} ${mm(y - 1.5)} L ${mm(tip)} ${mm(y)} L ${mm(tip - 3)} ${mm(y + 1.5)}"/>`,
    `<text x="${mm(tip - 20)}" y="${mm(y + 4)}" font-family="sans-serif" font-size="3" fill="#000" stroke="none">along the spine</text>`,
  ];
}

function rulers({ minX, maxY }: Page): string[] {
  const y = maxY - 6;
  return [
    `<path id="ruler-50-mm" d="${ruler(minX + 6, y, 50, 10)}"/>`,
    `<path id="ruler-2-in" d="${ruler(minX + 62, y, 2 * inch, inch / 2)}"/>`,
  ];
}

function ruler(x: number, y: number, length: number, step: number): string {
  const ticks = Array.from({ length: Math.round(length / step) + 1 }, (_, at) => x + at * step);
  const line: Point[] = [
    { x, y },
    { x: x + length, y },
  ];
  return [linePath(line), ...ticks.map((at) => `M ${mm(at)} ${mm(y - 2)} V ${mm(y + 0.5)}`)].join(
    ' ',
  );
}

const words = (x: number, y: number, text: string, size = 3): string =>
  `<text x="${mm(x)}" y="${mm(y)}" font-size="${size}">${text}</text>`;

const mm = (value: number): string => String(Math.round(value * 1000) / 1000 + 0);

const marks: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };
const escaped = (text: string): string => text.replaceAll(/[&<>"]/g, (mark) => marks[mark] ?? mark);
