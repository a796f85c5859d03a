import { readdirSync, readFileSync } from 'node:fs';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { draftKeyAt, readDraft, writeDraft } from './draft.ts';

const at = (form: string, search: string) => draftKeyAt(form, new URLSearchParams(search));

afterEach(() => vi.unstubAllGlobals());

describe('what is kept of a form', () => {
  it('belongs to what the address asked for, and is not lost to another', () => {
    const kept = new Map<string, string>();
    vi.stubGlobal('sessionStorage', {
      getItem: (key: string) => kept.get(key) ?? null,
      setItem: (key: string, text: string) => kept.set(key, text),
    });
    writeDraft(at('receive', 'hardware=2'), { quantity: 7 });
    expect(readDraft(at('receive', 'hardware=4'))).toBeUndefined();
    expect(readDraft(at('receive', 'hardware=2'))).toEqual({ quantity: 7 });
  });

  it('is the same whichever way round the address says it, and keeps its plain name without', () => {
    expect(at('quote-new', 'pattern=3&customer=2')).toBe(at('quote-new', 'customer=2&pattern=3'));
    expect(at('quote-new', '')).toBe('quote-new');
  });

  it('is kept by the address on every page that begins a form from it', () => {
    const routes = new URL('../app/routes/', import.meta.url);
    const begun = readdirSync(routes, { recursive: true, encoding: 'utf8' })
      .filter((name) => name.endsWith('.tsx'))
      .map((name) => ({ name, source: readFileSync(new URL(name, routes), 'utf8') }))
      .filter(({ source }) => /search\.get\('(customer|pattern|hardware)'\)/.test(source))
      .filter(({ source }) => /<\w+Form$/m.test(source));
    expect(begun.length).toBeGreaterThanOrEqual(4);
    const forgetful = begun.filter(({ source }) => !source.includes('draftKeyAt('));
    expect(forgetful.map(({ name }) => name)).toEqual([]);
  });
});
