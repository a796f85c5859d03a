import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { rackQuery } from './purchase-orders.queries.ts';
import type { FreeLot, TypedLine } from './typed-order.ts';

/**
 * What can go out to be worked on, and what the order had at first, free or not. The whole rack is much to read, so
 * that nothing is asked before a line needs it; undefined until it is there.
 */
export function useFreeLots(lines: readonly TypedLine[]): readonly FreeLot[] | undefined {
  const lotIds = lotIdsOf(lines);
  const [own] = useState(lotIds);
  const { data } = useQuery({ ...rackQuery(), enabled: lotIds.length > 0 });
  return useMemo(
    () => data?.items.filter(({ id, freeAreaMm2 }) => freeAreaMm2 !== '0' || own.includes(id)),
    [data, own],
  );
}

const lotIdsOf = (lines: readonly TypedLine[]): number[] =>
  lines.flatMap((line) => (line.of === 'service' ? [Number(line.lotId)] : []));
