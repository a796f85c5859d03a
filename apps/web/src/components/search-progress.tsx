import { countText } from '../lib/formatting.ts';
import { Button } from './button.tsx';

/** How far a search has come: a share from 0 to 1, and the pieces found so far. */
export interface Searching {
  done: number;
  pieces: number;
}

interface SearchProgressProps {
  searching: Searching;
  stopWord: string;
  /** While it is being stopped. */
  stopping?: boolean | undefined;
  onStop: () => void;
}

/** How far the search for the most pieces has come, and the way out of it. */
export function SearchProgress({ searching, stopWord, stopping, onStop }: SearchProgressProps) {
  const percent = Math.round(Math.min(1, searching.done) * 100);
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
      <div className="min-w-40 grow">
        <p>{`Looking for more: ${countText(searching.pieces)} so far`}</p>
        <div
          role="progressbar"
          aria-label="Search for the most pieces"
          aria-valuenow={percent}
          aria-valuemin={0}
          aria-valuemax={100}
          className="mt-1 h-2 overflow-hidden rounded-full bg-stitch/60"
        >
          <div className="h-full bg-verdigris" style={{ width: `${percent}%` }} />
        </div>
      </div>
      <Button busy={stopping} onClick={onStop}>
        {stopWord}
      </Button>
    </div>
  );
}
