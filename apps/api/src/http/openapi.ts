import {
  OpenAPIRegistry,
  OpenApiGeneratorV31,
  extendZodWithOpenApi,
  type RouteConfig,
} from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { endpoints, problem, statusOf, type Endpoint } from '@hidewright/contract';

extendZodWithOpenApi(z);

const problemReply = {
  description: 'A refusal, as RFC 9457 has it',
  content: { 'application/problem+json': { schema: problem } },
};

/** The interface, generated from the contract; `x-access` says who may call. */
export function openApiDocument() {
  const documents = new OpenAPIRegistry();
  for (const endpoint of endpoints) documents.registerPath(describe(endpoint));
  return new OpenApiGeneratorV31(documents.definitions).generateDocument({
    openapi: '3.1.0',
    info: { title: 'Hidewright', version: '0.1.0' },
    servers: [{ url: '/api' }],
  });
}

function describe(endpoint: Endpoint): RouteConfig {
  const request: NonNullable<RouteConfig['request']> = {};
  if (endpoint.params instanceof z.ZodObject) request.params = endpoint.params;
  if (endpoint.query instanceof z.ZodObject) request.query = endpoint.query;
  if (endpoint.body !== undefined) {
    request.body = { required: true, content: { 'application/json': { schema: endpoint.body } } };
  }
  if (endpoint.takes !== undefined) {
    const bytes = { schema: { type: 'string', format: 'binary' } } as const;
    const content = Object.fromEntries(endpoint.takes.types.map((type) => [type, bytes]));
    request.body = { required: true, content };
  }
  request.headers = z.object({
    ...(endpoint.edits === true ? { 'If-Match': z.string() } : {}),
    ...(endpoint.creates === true ? { 'Idempotency-Key': z.string().optional() } : {}),
  });
  return {
    method: endpoint.method.toLowerCase() as Lowercase<Endpoint['method']>,
    path: endpoint.path,
    summary: endpoint.summary,
    request,
    responses: {
      [statusOf(endpoint)]: replyOf(endpoint),
      default: problemReply,
    },
    'x-access': endpoint.access,
  };
}

function replyOf(endpoint: Endpoint) {
  if (endpoint.file !== undefined) {
    return { description: endpoint.summary, content: { [endpoint.file]: { schema: z.string() } } };
  }
  return {
    description: endpoint.summary,
    content: { 'application/json': { schema: endpoint.reply } },
  };
}
