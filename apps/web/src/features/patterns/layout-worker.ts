import '../../lib/zod-without-eval.ts';
import type { LayoutSource } from '@hidewright/contract';
import { laidOut } from './laid-out.ts';

/** A tag takes up to a second: worked out beside the page, so that typing never waits for it. */
self.addEventListener('message', ({ data }: MessageEvent<LayoutSource>) => {
  self.postMessage(laidOut(data));
});
