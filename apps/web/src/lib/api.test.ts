import { endpoint, idParams } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { ApiProblem } from './api-problem.ts';
import { addressOf } from './api.ts';
import { randomKey } from './random-key.ts';

const listParts = endpoint({
  method: 'GET',
  path: '/lots/{id}/parts',
  summary: 'Parts of a lot',
  access: ['owner'],
  params: idParams,
  query: z.strictObject({ q: z.string().optional(), state: z.array(z.string()).optional() }),
  reply: z.undefined(),
});

describe('the address of an endpoint', () => {
  it('puts its parameters in and leaves out what is not asked', () => {
    expect(addressOf(listParts, { params: { id: 7 } })).toBe('/api/lots/7/parts');
    expect(addressOf(listParts, { params: { id: 7 }, query: { q: '' } })).toBe('/api/lots/7/parts');
  });

  it('encodes what was typed, and repeats a list', () => {
    const address = addressOf(listParts, {
      params: { id: 7 },
      query: { q: 'a&b', state: ['x', 'y'] },
    });
    expect(address).toBe('/api/lots/7/parts?q=a%26b&state=x&state=y');
  });
});

describe('a refusal', () => {
  it('keeps the idempotency key only where the same request may pass later', () => {
    const passing = [0, 429, 500, 503];
    for (const status of [0, 400, 401, 409, 412, 422, 429, 500, 503]) {
      expect(new ApiProblem({ status }).isPassing).toBe(passing.includes(status));
    }
  });
});

describe('a random key', () => {
  it('is a version 4 UUID, in a secure context and out of one', () => {
    const pattern = /^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/;
    expect(randomKey()).toMatch(pattern);
    const descriptor = Object.getOwnPropertyDescriptor(Crypto.prototype, 'randomUUID');
    Object.defineProperty(Crypto.prototype, 'randomUUID', { value: undefined, configurable: true });
    try {
      expect(randomKey()).toMatch(pattern);
    } finally {
      if (descriptor) Object.defineProperty(Crypto.prototype, 'randomUUID', descriptor);
    }
  });
});
