import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  kitSettingFaults,
  kitStackFaults,
  lacksDie,
  settingFaults,
  type Setting,
  type Stack,
} from './post-fit.ts';

const rivet: Setting = {
  postLengthMm: '8',
  stackMinMm: '5',
  stackMaxMm: '6.5',
  settingDie: '',
  settingDieHere: true,
};
const twoOf5to6: Stack = { layers: 2, weightLowOz: '5', weightHighOz: '6' };

describe('a post against the folded stack', () => {
  it('is said to be too long where the stack is thinner than it holds', () => {
    // 2 × 5 oz = 10/64 in = 3.96875 mm, 2 × 6 oz = 4.7625 mm
    expect(settingFaults(rivet, twoOf5to6)).toEqual([
      'The post is 8 mm and holds 5 to 6.5 mm. Two layers of 5 to 6 oz are 4 to 4.8 mm: up to 1 mm too thin. Take a shorter one, or add a layer.',
    ]);
  });

  it('is said to be too short where the stack is thicker', () => {
    expect(settingFaults(rivet, { ...twoOf5to6, layers: 3 })).toEqual([
      'The post is 8 mm and holds 5 to 6.5 mm. Three layers of 5 to 6 oz are 6 to 7.1 mm: up to 0.6 mm too thick. Take a longer one, or fewer layers.',
    ]);
    const bare = { ...rivet, postLengthMm: '4', stackMinMm: null, stackMaxMm: null };
    expect(settingFaults(bare, twoOf5to6)).toEqual([
      'The post is 4 mm. Two layers of 5 to 6 oz are 4 to 4.8 mm: it does not come through. Take a longer one.',
    ]);
  });

  it('is held against lots by their own weight, which are named', () => {
    // 2 × 3 oz = 6/64 in = 2.38125 mm, 3 × 8 oz = 24/64 in = 9.525 mm
    const split = { weightLowOz: '3', weightHighOz: '3', lots: ['OT-201'] };
    expect(settingFaults(rivet, { ...split, layers: 2 })).toEqual([
      'The post is 8 mm and holds 5 to 6.5 mm. Two layers of lot OT-201, at 3 oz, are 2.4 mm: 2.6 mm too thin. Take a shorter one, or add a layer. Or cut from another lot.',
    ]);
    const heavy = { weightLowOz: '8', weightHighOz: '8', lots: ['OT-201', 'OT-202', 'OT-204'] };
    expect(settingFaults(rivet, { ...heavy, layers: 3 })).toEqual([
      'The post is 8 mm and holds 5 to 6.5 mm. Three layers of lots OT-201, OT-202 and OT-204, at 8 oz, are 9.5 mm: 3 mm too thick. Take a longer one, or fewer layers. Or cut from another lot.',
    ]);
    expect(settingFaults(rivet, { ...split, layers: 5 })).toEqual([]);
  });

  it('fits, or nothing certain is known', () => {
    const one = { ...twoOf5to6, layers: 3, weightHighOz: '5' };
    expect(settingFaults(rivet, one)).toEqual([]);
    expect(settingFaults(rivet, { layers: 2, weightLowOz: null, weightHighOz: null })).toEqual([]);
    const unsaid = { ...rivet, postLengthMm: null, stackMinMm: null, stackMaxMm: null };
    expect(settingFaults(unsaid, twoOf5to6)).toEqual([]);
  });

  it('names the setting die that is not in the shop', () => {
    const setting = { ...rivet, stackMinMm: null, settingDie: 'SD-9', settingDieHere: false };
    expect(settingFaults(setting, twoOf5to6)).toEqual([
      'It is set with the die SD-9, which is not in the shop.',
    ]);
    expect(settingFaults({ ...setting, settingDieHere: true }, twoOf5to6)).toEqual([]);
  });

  it('is looked at in a kit part by part, through two layers where nobody said', () => {
    const kit = { ...rivet, postLengthMm: null, stackMinMm: null, stackMaxMm: null };
    const part = { ...rivet, name: 'Post 8 mm' };
    const faults = kitSettingFaults(kit, [part], { ...twoOf5to6, layers: null });
    expect(faults).toEqual([`Post 8 mm: ${settingFaults(rivet, twoOf5to6)[0]}`]);
    const dieless = { ...kit, settingDie: 'SD-9', settingDieHere: false };
    expect([lacksDie(dieless), lacksDie(kit)]).toEqual([true, false]);
    expect(kitStackFaults(dieless, [part], { ...twoOf5to6, layers: null })).toEqual(faults);
  });

  it('is found sound exactly where the whole stack lies within what it holds', () => {
    const sixtyFourths = fc.integer({ min: 1, max: 400 });
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 20 }),
        ...[sixtyFourths, sixtyFourths, sixtyFourths, sixtyFourths],
        (layers, a, b, c, d) => {
          const [low, high] = a < b ? [a, b] : [b, a];
          const [least, most] = c < d ? [c, d] : [d, c];
          const mm = (n: number) => ((n * 396_875) / 1_000_000).toFixed(6);
          const faults = settingFaults(
            { ...rivet, postLengthMm: null, stackMinMm: mm(least), stackMaxMm: mm(most) },
            { layers, weightLowOz: String(low), weightHighOz: String(high) },
          );
          expect(faults).toHaveLength(low * layers >= least && high * layers <= most ? 0 : 1);
        },
      ),
    );
  });
});
