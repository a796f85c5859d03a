import { InvalidInput } from '../errors/domain-error.ts';
import type { Point } from '../outline/outline.ts';
import type { NestContainer, NestProblem } from './problem.ts';

/** Reads one case as the benchmark's file writes it: points as pairs, mm. @throws InvalidInput */
export function readNestCase(value: unknown): { id: string | null; problem: NestProblem } {
  const fields = asFields(value, 'case');
  const { id, outline, container, holes, gap, rotations, trim, flawClearance } = fields;
  const problem: NestProblem = {
    outline: asPoints(outline, 'outline'),
    container: asContainer(container),
    holes: holes === undefined || holes === null ? [] : asHoles(holes),
    gap: asOptional(gap, 'gap'),
    rotations: asRotations(rotations),
    trim: asOptional(trim, 'trim'),
    flawClearance: asOptional(flawClearance, 'flawClearance'),
  };
  return { id: typeof id === 'string' ? id : null, problem };
}

function asFields(value: unknown, field: string): Record<string, unknown> {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    throw new InvalidInput(field, `Give ${field} as one JSON object.`);
  }
  return { ...value };
}

function asNumber(value: unknown, field: string): number {
  if (typeof value !== 'number') throw new InvalidInput(field, `Give ${field} as a number.`);
  return value;
}

const asOptional = (value: unknown, field: string): number =>
  value === undefined || value === null ? 0 : asNumber(value, field);

function asPoints(value: unknown, field: string): Point[] {
  if (!Array.isArray(value)) {
    throw new InvalidInput(field, `Give ${field} as a list of [x, y] in mm.`);
  }
  return value.map((pair: unknown, at) => {
    if (!Array.isArray(pair) || pair.length !== 2) {
      throw new InvalidInput(`${field}.${at}`, `Give ${field}.${at} as [x, y] in mm.`);
    }
    const [x, y] = pair as [unknown, unknown];
    return { x: asNumber(x, `${field}.${at}`), y: asNumber(y, `${field}.${at}`) };
  });
}

function asHoles(value: unknown): Point[][] {
  if (!Array.isArray(value)) throw new InvalidInput('holes', 'Give holes as a list of polygons.');
  return value.map((hole: unknown, at) => asPoints(hole, `holes.${at}`));
}

function asRotations(value: unknown): readonly number[] | 'free' {
  if (value === 'free') return 'free';
  if (!Array.isArray(value)) {
    throw new InvalidInput('rotations', 'Give rotations as a list of degrees or as "free".');
  }
  return value.map((rot: unknown, at) => asNumber(rot, `rotations.${at}`));
}

function asContainer(value: unknown): NestContainer {
  const fields = asFields(value, 'container');
  const number = (name: string) => asNumber(fields[name], `container.${name}`);
  switch (fields['type']) {
    case 'rect':
      return { type: 'rect', w: number('w'), h: number('h') };
    case 'strip': {
      const width = number('width');
      return fields['qty'] === undefined || fields['qty'] === null
        ? { type: 'strip', width }
        : { type: 'strip', width, qty: number('qty') };
    }
    case 'polygon':
      return { type: 'polygon', points: asPoints(fields['points'], 'container.points') };
    default:
      throw new InvalidInput('container.type', 'Give container.type as rect, strip or polygon.');
  }
}
