import '../../lib/zod-without-eval.ts';
import type { LayoutSource } from '@hidewright/contract';
import { laidOut, type LayoutNews } from './laid-out.ts';

const tell = (news: LayoutNews) => self.postMessage(news);

/** A search takes seconds: worked out beside the page, so that typing never waits for it. */
self.addEventListener('message', ({ data }: MessageEvent<LayoutSource>) => {
  const answer = laidOut(data, {
    onProgress: (done, pieces) => tell({ searching: { done, pieces } }),
  });
  tell({ answer });
});
