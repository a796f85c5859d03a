import { describe, expect, it } from 'vitest';
import { Searches } from './searches.ts';

const found = async () => ({ state: 'done', found: 'much' }) as const;
const settled = () => new Promise((resolve) => setTimeout(resolve));

describe('searches that ended', () => {
  it('are forgotten after ten minutes', async () => {
    let now = 0;
    const searches = new Searches<string>(() => now);
    const id = searches.start('one', found)?.id ?? '';
    await settled();
    now = 10 * 60_000;
    expect(searches.find(id)?.ending).toEqual({ state: 'done', found: 'much' });
    now += 1;
    expect(searches.find(id)).toBeUndefined();
  });

  it('are kept up to so many, the latest of them', async () => {
    const searches = new Searches<string>(() => 0);
    const ids: string[] = [];
    for (let at = 0; at < 40; at += 1) {
      ids.push(searches.start(`number ${at}`, found)?.id ?? '');
      await settled();
    }
    const kept = ids.filter((id) => searches.find(id) !== undefined);
    expect(kept).toEqual(ids.slice(-32));
  });
});
