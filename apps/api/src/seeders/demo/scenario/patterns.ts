import type { PatternDefinition } from '@hidewright/contract';
import type { HardwareName, LeatherName } from './stockroom.ts';

/** As in a definition, with names in place of numbers. */
interface NamedOption {
  name: string;
  swaps: { hardware: HardwareName | null; by: HardwareName | null; perPiece: number }[];
}

type Named = Omit<PatternDefinition, 'leatherId' | 'hardware' | 'options' | 'history'> & {
  leather: LeatherName;
  hardware: { name: HardwareName; perPiece: number; per?: 'hundred'; fromStep?: number }[];
  options?: NamedOption[];
};

interface DemoPattern {
  name: string;
  definition: Named;
  die: { number: string; slot: string; cost: string; lifeUses: number } | null;
}

/** An 11 × 13 in panel, which the shop's casing tray takes. */
const panel = { form: 'panel', widthMm: '279.4', heightMm: '330.2' } as const;
const spaced = { spacingMm: '2', trimMm: '3', turns: 'quarter turns' } as const;

const step = (
  name: string,
  per: 'piece' | 'strike' | 'panel' | 'strip' | 'run',
  setupMinutes: string,
  secondsPerUnit: string,
  rejectPercent: string,
) => ({ name, per, setupMinutes, secondsPerUnit, rejectPercent });

/** Struck while damp. */
const cased = { ...step('Case panels', 'panel', '6', '40', '0'), longestWait: '30' };

export const patterns = [
  {
    name: 'Drinks coaster, round',
    definition: {
      layoutBy: 'outline',
      outline: { shape: 'round', diameterMm: '95' },
      handCount: null,
      // 12 × 16 in: three by four, where 11 × 13 would give only six.
      container: { form: 'panel', widthMm: '304.8', heightMm: '406.4' },
      ...spaced,
      leather: 'Oak tan natural 7–8 oz',
      hardware: [
        { name: 'Card sleeves, kraft', perPiece: 1 },
        { name: 'Edge dye, dark brown', perPiece: 60, per: 'hundred' },
      ],
      supplies: [{ name: 'Beeswax', cost: '0.9', per: 'hundred' }],
      work: {
        kind: 'steps',
        steps: [
          cased,
          step('Stamp', 'strike', '10', '9', '3'),
          step('Cut', 'piece', '5', '6', '2'),
          // Packed bone dry.
          { ...step('Dye and burnish edges', 'piece', '6', '24', '2'), shortestWait: '60' },
          step('Inspect and pack', 'piece', '4', '12', '1'),
        ],
      },
      needsDie: true,
      needsPlate: true,
    },
    die: { number: '3', slot: 'A1', cost: '78.00', lifeUses: 40_000 },
  },
  {
    name: 'Luggage tag with neck',
    definition: {
      layoutBy: 'outline',
      outline: {
        shape: 'tag',
        lengthMm: '112',
        widthMm: '62',
        neckLengthMm: '26',
        neckWidthMm: '26',
        cornerRadiusMm: '9',
      },
      handCount: null,
      container: panel,
      ...spaced,
      leather: 'Oak tan russet 5–6 oz',
      hardware: [
        { name: 'Buckles 20 mm, solid brass', perPiece: 1 },
        // Set at Fold and rivet: a tag that fails then has used them up.
        { name: 'Rivets 7 mm, antique brass', perPiece: 2, fromStep: 3 },
        { name: 'Edge dye, dark brown', perPiece: 45, per: 'hundred' },
      ],
      options: [
        {
          name: 'With a brass ring',
          swaps: [
            {
              hardware: 'Buckles 20 mm, solid brass',
              by: 'D-rings 25 mm, solid brass',
              perPiece: 1,
            },
          ],
        },
      ],
      work: {
        kind: 'steps',
        steps: [
          cased,
          step('Stamp', 'strike', '10', '9', '3'),
          step('Cut', 'piece', '5', '6', '1.5'),
          step('Fold and rivet', 'piece', '8', '42', '2'),
          step('Inspect and pack', 'piece', '4', '14', '1'),
        ],
      },
      needsDie: true,
      needsPlate: true,
    },
    die: { number: '7', slot: 'A2', cost: '96.00', lifeUses: 40_000 },
  },
  {
    name: 'Cord wrap with two snaps',
    definition: {
      layoutBy: 'outline',
      outline: { shape: 'oval', widthMm: '118', heightMm: '42' },
      handCount: null,
      container: panel,
      ...spaced,
      leather: 'Oak tan russet 5–6 oz',
      hardware: [{ name: 'Snaps, line 20, brass', perPiece: 1 }],
      work: {
        kind: 'steps',
        steps: [
          step('Case panels', 'panel', '6', '40', '0'),
          step('Stamp', 'strike', '10', '9', '3'),
          step('Cut', 'piece', '5', '6', '2'),
          step('Set snaps', 'piece', '6', '18', '2'),
          step('Inspect and pack', 'piece', '3', '8', '1'),
        ],
      },
      needsDie: true,
      needsPlate: true,
    },
    die: { number: '9', slot: 'A3', cost: '84.00', lifeUses: 40_000 },
  },
  {
    name: 'Bookmark',
    definition: {
      layoutBy: 'outline',
      outline: { shape: 'rectangle', widthMm: '38', heightMm: '178', cornerRadiusMm: '8' },
      handCount: null,
      container: { form: 'strip', widthMm: '190', lengthMm: '600' },
      ...spaced,
      leather: 'Chestnut lining 3–4 oz',
      hardware: [{ name: 'Card sleeves, kraft', perPiece: 1 }],
      work: {
        kind: 'steps',
        steps: [
          step('Cut strips', 'strip', '4', '50', '0'),
          step('Stamp', 'strike', '10', '8', '3'),
          step('Cut', 'piece', '5', '6', '1.5'),
          step('Inspect and sleeve', 'piece', '3', '11', '1'),
        ],
      },
      needsDie: true,
      needsPlate: true,
    },
    die: { number: '12', slot: 'B1', cost: '71.00', lifeUses: 40_000 },
  },
  {
    name: 'Valet tray panel',
    definition: {
      layoutBy: 'outline',
      outline: { shape: 'rectangle', widthMm: '240', heightMm: '190', cornerRadiusMm: '10' },
      handCount: null,
      container: { form: 'panel', widthMm: '508', heightMm: '609.6' },
      turns: 'quarter turns',
      spacingMm: '3',
      trimMm: '4',
      leather: 'Oak tan natural 7–8 oz',
      hardware: [{ name: 'Snaps, line 20, brass', perPiece: 4 }],
      work: {
        kind: 'steps',
        steps: [
          step('Cut', 'piece', '8', '14', '2'),
          step('Stamp', 'strike', '10', '12', '2'),
          step('Edges', 'piece', '8', '150', '2'),
          step('Set snaps', 'piece', '6', '95', '2'),
          step('Inspect and pack', 'piece', '5', '35', '1'),
        ],
      },
      needsDie: true,
      needsPlate: true,
    },
    die: { number: '15', slot: 'B2', cost: '142.00', lifeUses: 30_000 },
  },
  {
    name: 'Zip-pull',
    definition: {
      layoutBy: 'hand count',
      outline: null,
      handCount: { pieces: 98, widthMm: '279.4', heightMm: '330.2' },
      container: null,
      ...spaced,
      leather: 'Oak tan russet 5–6 oz',
      hardware: [{ name: 'Split rings 12 mm, nickel', perPiece: 1 }],
      work: { kind: 'minutesPer100', minutes: '75', rejectPercent: '5' },
      needsDie: false,
      needsPlate: false,
    },
    die: null,
  },
] as const satisfies DemoPattern[];

export type PatternName = (typeof patterns)[number]['name'];
