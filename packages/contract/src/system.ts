import { z } from 'zod';
import { endpoint } from './endpoint.ts';

export const readHealth = endpoint({
  method: 'GET',
  path: '/health',
  summary: 'Whether the server and its database answer',
  access: 'anyone',
  reply: z.object({ status: z.literal('ok') }),
});

export const readOpenApi = endpoint({
  method: 'GET',
  path: '/openapi.json',
  summary: 'This interface, as OpenAPI 3.1',
  access: 'anyone',
  reply: z.unknown(),
});
