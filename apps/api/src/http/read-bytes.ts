import express, { type Request, type Response } from 'express';
import type { Endpoint } from '@hidewright/contract';
import { Problem } from './problem.ts';

/**
 * Reads a file that is sent as it is into the request's body.
 * @throws {Problem} 413 when it is too large, 415 when it is of no type that is taken
 */
export async function readBytes(
  { types, mostBytes, refusal }: NonNullable<Endpoint['takes']>,
  request: Request,
  response: Response,
): Promise<void> {
  const read = express.raw({ type: [...types], limit: mostBytes, inflate: false });
  await new Promise<void>((resolve, reject) => {
    read(request, response, (error?: unknown) => (error === undefined ? resolve() : reject(error)));
  }).catch((error: unknown) => {
    throw isTooLarge(error) ? new Problem(413, 'Too large', refusal.bytes) : error;
  });
  if (!Buffer.isBuffer(request.body)) throw new Problem(415, 'Not such a file', refusal.type);
}

const isTooLarge = (error: unknown) =>
  error instanceof Error && 'type' in error && error.type === 'entity.too.large';
