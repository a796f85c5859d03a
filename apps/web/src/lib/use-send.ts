import type { Endpoint, ReplyOf } from '@hidewright/contract';
import { useMutation, useQueryClient, type QueryKey } from '@tanstack/react-query';
import { useRef } from 'react';
import { ApiProblem } from './api-problem.ts';
import { call, type CallInput } from './api.ts';
import { randomKey } from './random-key.ts';

interface SendOptions<E extends Endpoint> {
  /** What must be read again afterwards: everything but the session, unless said. */
  invalidates?: readonly QueryKey[] | undefined;
  onSent?: ((reply: ReplyOf<E>) => unknown) | undefined;
}

/**
 * A mutation of one endpoint. A submit that failed without an answer keeps its idempotency key for the next try
 * with the same content, so that pressing twice makes one thing.
 */
export function useSend<E extends Endpoint>(endpoint: E, options: SendOptions<E> = {}) {
  const client = useQueryClient();
  const pending = useRef<{ content: string; key: string } | undefined>(undefined);
  return useMutation<ReplyOf<E>, Error, CallInput<E>>({
    mutationFn: async (input) => {
      const content = JSON.stringify([input.params, input.body]);
      if (pending.current?.content !== content) pending.current = { content, key: randomKey() };
      const keyed = { ...input, idempotencyKey: pending.current.key };
      try {
        const reply = await (call as (endpoint: E, input: CallInput<E>) => Promise<ReplyOf<E>>)(
          endpoint,
          keyed,
        );
        pending.current = undefined;
        return reply;
      } catch (error) {
        if (error instanceof ApiProblem && !error.isPassing) pending.current = undefined;
        throw error;
      }
    },
    onSuccess: async (reply) => {
      await options.onSent?.(reply);
      const keys = options.invalidates;
      await (keys
        ? Promise.all(keys.map((queryKey) => client.invalidateQueries({ queryKey })))
        : client.invalidateQueries({ predicate: (query) => query.queryKey[0] !== 'session' }));
    },
  });
}
