import type { PurchaseLine } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { receivedWords } from './received-words.ts';

const habit = { areaUnit: 'ft2', areaShown: 'tenth', today: '2026-12-10' } as const;
const rivets = { receivedAreaMm2: null, measuredAreaMm2: null, received: 1000, unit: 'piece' };
const words = (line: object) => receivedWords({ sentBack: null, ...line } as PurchaseLine, habit);

describe('what came of a line', () => {
  it('says that it is by its marks where it was measured otherwise', () => {
    const sides = { receivedAreaMm2: '5574182.4', measuredAreaMm2: '5406956.928', received: null };
    expect(words({ ...sides, unit: null })).toMatchObject({
      came: '60.0 ft²',
      measured: 'by its marks, 58.2 ft² measured',
    });
  });

  it('says what went back, and when', () => {
    const back = { areaMm2: null, quantity: 20, firstOn: '2026-12-03', lastOn: '2026-12-03' };
    expect(words(rivets)).toEqual({ came: '1,000', measured: undefined, sentBack: undefined });
    expect(words({ ...rivets, sentBack: back }).sentBack).toBe('20 sent back on Thu 3 Dec');
    expect(words({ ...rivets, sentBack: { ...back, lastOn: '2026-12-04' } }).sentBack).toBe(
      '20 sent back, last on Fri 4 Dec',
    );
  });
});
