import type { LotLayout, LotSearch } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useEffect, useRef, type ReactNode } from 'react';
import { Notice } from '../../../components/notice.tsx';
import { SearchProgress } from '../../../components/search-progress.tsx';
import { useStopLotSearch } from '../lots.mutations.ts';
import { lotSearchQuery } from '../lots.queries.ts';

interface RunningSearchProps {
  id: string;
  /** What was found, drawn. */
  children: (found: LotLayout) => ReactNode;
}

/** A search for the most pieces: how far it is and how to stop it, and in its place what it found. */
export function RunningSearch({ id, children }: RunningSearchProps) {
  const { data: search, error } = useQuery(lotSearchQuery(id));
  const stop = useStopLotSearch();
  const place = useRef<HTMLDivElement>(null);
  const looking = search === undefined || search.state === 'looking';
  // What has ended stays in sight when the server has forgotten it.
  const wrong = looking ? (error ?? stop.error) : null;

  useEffect(() => {
    // The stop button that was pressed is gone: the keyboard goes on from here.
    if (!looking && document.activeElement === document.body) place.current?.focus();
  }, [looking]);

  return (
    <div ref={place} tabIndex={-1} className="mt-5 outline-none" aria-busy={looking && !wrong}>
      {wrong && (
        <Notice tone="danger" live title="The search cannot be followed.">
          {wrong.message}
        </Notice>
      )}
      {looking && !wrong && <Looking search={search} stop={stop} />}
      {search?.refusal && (
        <Notice tone="attention" live>
          {search.refusal}
        </Notice>
      )}
      {search?.layout && (
        <>
          <p role="status">{endWords(search.state, search.layout)}</p>
          {children(search.layout)}
        </>
      )}
    </div>
  );
}

interface LookingProps {
  search: LotSearch | undefined;
  stop: ReturnType<typeof useStopLotSearch>;
}

function Looking({ search, stop }: LookingProps) {
  if (search === undefined || search.pieces === null) return <p>Laying them in rows first …</p>;
  const { id, done, pieces } = search;
  return (
    <SearchProgress
      searching={{ done, pieces }}
      stopWord="Stop, this will do"
      stopping={stop.isPending}
      onStop={() => stop.mutate({ params: { id } })}
    />
  );
}

function endWords(state: LotSearch['state'], { by }: LotLayout): string {
  if (state === 'stopped') return 'Stopped. This is the most found so far.';
  return by === 'rows' ? 'Rows give as many as could be found.' : 'The most that could be found.';
}
