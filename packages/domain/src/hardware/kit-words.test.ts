import { describe, expect, it } from 'vitest';
import { kitWords, wholeKits } from './kit-words.ts';

describe('a kit', () => {
  it('is said by its parts', () => {
    const [cap, post, washer] = ['Cap', 'Post', 'Washer'].map((name) => ({ name, quantity: 1 }));
    expect(kitWords([cap!, { ...post!, quantity: 2 }])).toBe('a kit of 1 × Cap and 2 × Post');
    expect(kitWords([cap!, post!, { ...washer!, quantity: 1000 }])).toBe(
      'a kit of 1 × Cap, 1 × Post and 1,000 × Washer',
    );
    expect(kitWords([{ ...cap!, quantity: 2 }])).toBe('a kit of 2 × Cap');
  });

  it('is there as often as its scarcest part makes it up whole', () => {
    const of = (quantity: number, there: number) => ({ quantity, there });
    expect(wholeKits([of(1, 250), of(2, 205)])).toBe(102);
    expect(wholeKits([of(1, 250), of(2, 1)])).toBe(0);
  });
});
