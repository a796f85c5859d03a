import type { Router } from 'express';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { endpoints } from '@hidewright/contract';
import { createApp } from '../app.ts';
import { startTestShop } from '../testing/test-shop.ts';

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

interface Operation {
  'x-access': 'anyone' | 'link' | string[];
}

const roles = ['owner', 'maker', 'bookkeeper'] as const;

let shop: Awaited<ReturnType<typeof startTestShop>>;
let operations: { method: Method; path: string; access: Operation['x-access'] }[];

beforeAll(async () => {
  shop = await startTestShop();
  const { body } = await shop.nobody().get('/api/openapi.json').expect(200);
  operations = Object.entries(body.paths as Record<string, Record<Method, Operation>>).flatMap(
    ([path, methods]) =>
      Object.entries(methods).map(([method, operation]) => ({
        method: method as Method,
        path: path.replaceAll(/\{\w+\}/g, '987654321'),
        access: operation['x-access'],
      })),
  );
});

afterAll(async () => {
  await shop.close();
});

describe('[S14] who may call what', () => {
  it('is said for every endpoint of the document', () => {
    expect(operations).toHaveLength(endpoints.length);
    for (const { access } of operations) {
      const named =
        Array.isArray(access) &&
        access.length > 0 &&
        access.every((role) => roles.some((known) => known === role));
      expect(named || access === 'anyone' || access === 'link').toBe(true);
    }
  });

  it('is said for every route of the application, and each is in the contract', async () => {
    const declared = endpoints.map(
      ({ method, path }) => `${method} ${path.replaceAll(/\{(\w+)\}/g, ':$1')}`,
    );
    const served = routesOf(await createApp(shop.context));
    expect(served.filter((route) => !declared.includes(route))).toEqual([]);
    expect(declared.filter((route) => !served.includes(route))).toEqual([]);
  });

  it('holds for nobody: every endpoint that names roles asks to sign in', async () => {
    for (const { method, path, access } of operations) {
      if (!Array.isArray(access)) continue;
      const { status } = await shop.nobody()[method](`/api${path}`);
      expect(`${method} ${path} ${status}`).toBe(`${method} ${path} 401`);
    }
  });

  it.each(roles)('holds for the %s', async (role) => {
    for (const { method, path, access } of operations) {
      if (!Array.isArray(access)) continue;
      const { status } = await shop.as(role)[method](`/api${path}`);
      expect(`${method} ${path} refused: ${status === 403}`).toBe(
        `${method} ${path} refused: ${!access.includes(role)}`,
      );
      expect(status, `${method} ${path}`).toBeLessThan(500);
    }
  });
});

interface Layer {
  route?: { path: string; methods: Record<string, boolean> };
  handle: { stack?: Layer[] };
  slash?: boolean;
}

/** Every route that the API routers answer, read off the application itself. */
function routesOf(app: { router: Router }): string[] {
  const layers = (app.router as unknown as { stack: Layer[] }).stack;
  return layers
    .flatMap((layer) => routesBelow(layer))
    .filter((route) => !route.includes('{*path}'));
}

function routesBelow({ route, handle }: Layer): string[] {
  if (route !== undefined) {
    // The sign-in limits share the sign-in's address; they are counted once.
    return [...new Set(Object.keys(route.methods))].map(
      (method) => `${method.toUpperCase()} ${route.path}`,
    );
  }
  return (handle.stack ?? []).flatMap(routesBelow);
}
