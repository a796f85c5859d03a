/**
 * An L: the rectangle width × height without its upper right corner, so that the left arm is
 * armWidth wide and the lower one armHeight high. A rectangle is an L whose arms are as large as it.
 */
export interface Ell {
  width: number;
  height: number;
  armWidth: number;
  armHeight: number;
}

/** An L within another: its own corner lies at (x, y) of that, and its sides run left or down where it is mirrored. */
export interface Part {
  ell: Ell;
  x: number;
  y: number;
  left: boolean;
  down: boolean;
}

export type Cut = readonly [Part, Part];

/** The places where cuts may run in a side of a length. */
export type Places = (side: number) => readonly number[];

const ell = (width: number, height: number, armWidth: number, armHeight: number): Ell => ({
  width,
  height,
  armWidth,
  armHeight,
});
export const box = (width: number, height: number): Ell => ell(width, height, width, height);
export const part = (of: Ell, x: number, y: number, left = false, down = false): Part => ({
  ell: of,
  x,
  y,
  left,
  down,
});

export const isBox = ({ width, armWidth }: Ell): boolean => width === armWidth;

export const areaOf = ({ width, height, armWidth, armHeight }: Ell): number =>
  width * height - (width - armWidth) * (height - armHeight);

/** The same L seen from the other side of the diagonal. */
export const mirrored = ({ width, height, armWidth, armHeight }: Ell): Ell =>
  ell(height, width, armHeight, armWidth);

function mirroredPart({ ell: of, x, y, left, down }: Part): Part {
  return { ell: mirrored(of), x: y, y: x, left: down, down: left };
}

/**
 * Every way of cutting a rectangle or an L in two, of which each is a rectangle or an L again, by a
 * line of up to three stretches. Source: the L-approach of E. G. Birgin, R. D. Lobato and R. Morabito,
 * "An effective recursive partitioning approach for the packing of identical rectangles in a
 * rectangle", Journal of the Operational Research Society 61 (2010), from memory; the cuts are derived
 * anew.
 */
export function* cutsOf(of: Ell, places: Places): Generator<Cut> {
  const cuts = isBox(of) ? boxCuts : ellCuts;
  yield* cuts(of, places);
  for (const [a, b] of cuts(mirrored(of), places)) yield [mirroredPart(a), mirroredPart(b)];
  yield* isBox(of) ? cornerCuts(of, places) : innerCuts(of, places);
}

/** Straight up, and up, across and up again. */
function* boxCuts({ width, height }: Ell, places: Places): Generator<Cut> {
  for (const a of places(width))
    yield [part(box(a, height), 0, 0), part(box(width - a, height), a, 0)];
  for (const a of places(width)) {
    for (const c of places(width)) {
      if (c <= a) continue;
      for (const b of places(height)) {
        yield [
          part(ell(c, height, a, height - b), 0, height, false, true),
          part(ell(width - a, height, width - c, b), width, 0, true, false),
        ];
      }
    }
  }
}

function* cornerCuts({ width, height }: Ell, places: Places): Generator<Cut> {
  for (const a of places(width)) {
    for (const b of places(height)) {
      yield [
        part(box(a, b), 0, 0),
        part(ell(width, height, width - a, height - b), width, height, true, true),
      ];
    }
  }
}

/** An L off the lower left, an L as large as what is left over it. */
function* innerCuts({ width, height, armWidth, armHeight }: Ell, places: Places): Generator<Cut> {
  for (const a of places(width)) {
    if (a >= armWidth) break;
    for (const b of places(height)) {
      if (b >= armHeight) break;
      yield [
        part(ell(width - a, height - b, armWidth - a, armHeight - b), a, b),
        part(ell(width, height, a, b), 0, 0),
      ];
    }
  }
}

/** Straight up, and from the inner corner or the inner side towards the left. */
function* ellCuts(of: Ell, places: Places): Generator<Cut> {
  const { width, height, armWidth, armHeight } = of;
  for (const a of places(width)) yield straightUp(of, a);
  yield straightUp(of, armWidth);
  for (const a of places(width)) {
    if (a >= armWidth) break;
    yield [
      part(box(width - a, armHeight), a, 0),
      part(ell(armWidth, height, a, height - armHeight), 0, height, false, true),
    ];
    yield [
      part(box(armWidth - a, height - armHeight), a, armHeight),
      part(ell(width, height, a, armHeight), 0, 0),
    ];
    for (const b of places(height)) {
      if (b < armHeight) yield leftAndDown(of, a, b);
      else if (b > armHeight) {
        yield leftAndUp(of, a, b);
        yield [
          part(ell(width - a, b, armWidth - a, armHeight), a, 0),
          part(ell(armWidth, height, a, height - b), 0, height, false, true),
        ];
      }
    }
  }
}

function straightUp({ width, height, armWidth, armHeight }: Ell, a: number): Cut {
  return a <= armWidth
    ? [part(box(a, height), 0, 0), part(ell(width - a, height, armWidth - a, armHeight), a, 0)]
    : [part(ell(a, height, armWidth, armHeight), 0, 0), part(box(width - a, armHeight), a, 0)];
}

/** From the inner corner to the left as far as a, down to b, and left to the edge. */
function leftAndDown({ width, height, armWidth, armHeight }: Ell, a: number, b: number): Cut {
  return [
    part(ell(armWidth, height - b, a, height - armHeight), 0, height, false, true),
    part(ell(width, armHeight, width - a, b), width, 0, true, false),
  ];
}

/** From the inner corner to the left as far as a, up to b, and left to the edge. */
function leftAndUp({ width, height, armWidth, armHeight }: Ell, a: number, b: number): Cut {
  return [
    part(ell(armWidth, height - armHeight, armWidth - a, height - b), armWidth, height, true, true),
    part(ell(width, b, a, armHeight), 0, 0),
  ];
}
