import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { confidential, withoutConfidential } from '@hidewright/contract';

const priced = z.object({ name: z.string(), price: confidential(z.string()) });
const reply = z.object({
  items: z.array(priced),
  best: priced.nullable(),
  by: z.record(z.string(), priced),
  either: z.union([priced, z.object({ note: z.string() })]),
});
const item = { name: 'Coaster', price: '3.30' };
const whole = { items: [item], best: item, by: { one: item }, either: item };

describe('[S15] what a schema calls confidential', () => {
  it('is left out for the maker wherever it stands', () => {
    const told = { name: 'Coaster' };
    expect(withoutConfidential(reply, whole, 'maker')).toEqual({
      items: [told],
      best: told,
      by: { one: told },
      either: told,
    });
  });

  it.each(['owner', 'bookkeeper'] as const)('is there for the %s', (role) => {
    expect(withoutConfidential(reply, whole, role)).toEqual(whole);
  });

  it('passes on no field that the schema does not name', () => {
    expect(withoutConfidential(priced, { ...item, secret: 'x' }, 'owner')).toEqual(item);
  });

  it('fails rather than let through what fits no branch', () => {
    expect(() => withoutConfidential(reply, { ...whole, either: { cost: '1' } }, 'maker')).toThrow(
      TypeError,
    );
  });
});
