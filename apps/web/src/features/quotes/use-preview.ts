import type { RunBasis } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useMemo } from 'react';
import { useWatch } from 'react-hook-form';
import { previewOf, type Preview, type TypedSoFar } from './price-preview.ts';
import { runBasisQuery } from './quotes.queries.ts';

export interface PreviewSoFar {
  basis: RunBasis | undefined;
  preview: Preview | { why: string } | undefined;
}

/** The numbers of the form as it stands, once a pattern is chosen. */
export function usePreview(): PreviewSoFar {
  const typed = useDeferredValue(
    useWatch() as TypedSoFar & {
      patternId?: unknown;
      customerId?: unknown;
    },
  );
  const patternId = Number(typed.patternId);
  const chosen = Number.isInteger(patternId) && patternId > 0;
  const customerId = Number(typed.customerId) || undefined;
  const { data: basis, error } = useQuery({
    ...runBasisQuery(patternId, customerId),
    enabled: chosen,
  });
  const preview = useMemo(() => {
    if (error) return { why: error.message };
    return basis && previewOf(basis, typed);
  }, [basis, error, typed]);
  return { basis: chosen ? basis : undefined, preview: chosen ? preview : undefined };
}
