import type { Point } from '@hidewright/domain';
import { X } from 'lucide-react';
import { sizeText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { boxOf } from '../side-sketch.ts';

interface FlawListProps {
  flaws: readonly Point[][];
  onRemove: (at: number) => void;
}

/** The flaws in words, each to be taken off again. */
export function FlawList({ flaws, onRemove }: FlawListProps) {
  const { lengthUnit } = useWorkshop();
  if (flaws.length === 0) return <p className="text-ink-soft">No flaws are drawn.</p>;
  return (
    <ul className="flex flex-wrap gap-2" aria-label="Flaws">
      {flaws.map((flaw, at) => {
        const { width, height } = boxOf(flaw);
        const words = `Flaw ${at + 1}, ${sizeText(String(width), String(height), lengthUnit)}`;
        return (
          <li key={at} className="flex items-center gap-1 rounded bg-oxblood-pale pl-3">
            {words}
            <button
              type="button"
              className="grid size-10 place-items-center rounded hover:bg-manila"
              aria-label={`Remove flaw ${at + 1}`}
              onClick={() => onRemove(at)}
            >
              <X size={16} aria-hidden="true" />
            </button>
          </li>
        );
      })}
    </ul>
  );
}
