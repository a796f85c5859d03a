import { InvalidInput } from '../errors/domain-error.ts';

/** What a press takes and manages, by its owner's own figures; null where they gave none. In mm and mm². */
export interface PressLimits {
  bedWidthMm: number;
  bedDepthMm: number;
  /** from the column to the front of the bed; null for a press that is open on both sides */
  throatMm: number | null;
  /** length of cutting edge that one strike still cuts through */
  ruleMm: number | null;
  /** area of relief that one strike still marks */
  reliefAreaMm2: number | null;
}

/** What one strike asks of a press. */
export interface Strike {
  cuttingEdgeMm: number;
  /** null where no plate is struck, or its relief is not known */
  reliefAreaMm2: number | null;
}

export interface Load {
  /** mm of cutting edge, or mm² of relief */
  asked: number;
  manages: number;
  /** asked as a share of what it manages; 1 is all of it */
  share: number;
  word: 'with ease' | 'well enough' | 'near its limit' | 'too much';
}

/** From which share on which word is said: the owner's figure is an experience, not a measurement. */
const nearly = 0.85;
const easily = 0.5;

/**
 * How one strike stands against what a press manages; null where the owner gave no figure or the
 * strike has no such part.
 * @throws InvalidInput for a figure that is not above 0
 */
export function pressLoad(
  press: PressLimits,
  strike: Strike,
): { rule: Load | null; relief: Load | null } {
  return {
    rule: loadOf(strike.cuttingEdgeMm, press.ruleMm, 'ruleMm'),
    relief: loadOf(strike.reliefAreaMm2, press.reliefAreaMm2, 'reliefAreaMm2'),
  };
}

function loadOf(asked: number | null, manages: number | null, field: string): Load | null {
  if (asked === null || manages === null) return null;
  if (!(manages > 0)) throw new InvalidInput(field, 'Write what the press manages as more than 0.');
  const share = asked / manages;
  return { asked, manages, share, word: wordFor(share) };
}

function wordFor(share: number): Load['word'] {
  if (share > 1) return 'too much';
  if (share > nearly) return 'near its limit';
  return share > easily ? 'well enough' : 'with ease';
}

/** The widest strip that can be fed along the bed's width: no deeper than the bed and the throat. */
export function widestStripMm({ bedDepthMm, throatMm }: PressLimits): number {
  return Math.min(bedDepthMm, throatMm ?? Infinity);
}

/** Whether a panel lies whole on the bed, either way round, without passing the throat. */
export function takesPanel(press: PressLimits, widthMm: number, heightMm: number): boolean {
  const depth = widestStripMm(press);
  return (
    (widthMm <= press.bedWidthMm && heightMm <= depth) ||
    (heightMm <= press.bedWidthMm && widthMm <= depth)
  );
}

export interface LeastSpacing {
  mm: number;
  /** what asks for it; null where nothing is known */
  because: 'rule' | 'border' | null;
}

/**
 * The least spacing between two cuts that the tooling allows. The die's rule stands outside the
 * outline by its thickness, and the plate's border marks the leather around it: neither may reach
 * the next piece. Common practice, no source.
 */
export function leastSpacing(tooling: {
  ruleThicknessMm: number | null;
  borderMm: number | null;
}): LeastSpacing {
  const [rule, border] = [tooling.ruleThicknessMm ?? 0, tooling.borderMm ?? 0];
  if (rule === 0 && border === 0) return { mm: 0, because: null };
  return border > rule ? { mm: border, because: 'border' } : { mm: rule, because: 'rule' };
}
