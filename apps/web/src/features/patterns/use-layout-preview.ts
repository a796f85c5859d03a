import type { LayoutSource } from '@hidewright/contract';
import { useEffect, useState } from 'react';
import type { Searching } from '../../components/search-progress.tsx';
import type { LaidOut, LayoutNews } from './laid-out.ts';

interface Preview {
  /** Of the last input that could be laid out; what is typed now may not be answered yet. */
  answer: LaidOut | undefined;
  working: boolean;
  /** While the most pieces are looked for. */
  searching: Searching | undefined;
}

const pauseMs = 150;

/** Works the layout out while it is typed; a new input drops the old question. */
export function useLayoutPreview(source: LayoutSource | undefined): Preview {
  const [answered, setAnswered] = useState<{ key: string; answer: LaidOut }>();
  const [searching, setSearching] = useState<Searching>();
  const key = source === undefined ? '' : JSON.stringify(source);

  useEffect(() => {
    if (key === '') return undefined;
    let worker: Worker | undefined;
    const start = setTimeout(() => {
      worker = new Worker(new URL('./layout-worker.ts', import.meta.url), { type: 'module' });
      worker.addEventListener('message', ({ data }: MessageEvent<LayoutNews>) => {
        if ('searching' in data) setSearching(data.searching);
        else setAnswered({ key, answer: data.answer });
      });
      worker.postMessage(JSON.parse(key));
    }, pauseMs);
    return () => {
      clearTimeout(start);
      worker?.terminate();
      setSearching(undefined);
    };
  }, [key]);

  if (key === '') return { answer: undefined, working: false, searching: undefined };
  const working = answered?.key !== key;
  return { answer: answered?.answer, working, searching: working ? searching : undefined };
}
