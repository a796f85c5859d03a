import { ZoomIn, ZoomOut } from 'lucide-react';
import { useState, type ReactNode } from 'react';

const steps = [1, 1.5, 2, 3, 4];

interface ZoomFrameProps {
  /** What is shown, for the ear. */
  label: string;
  /** A picture of little detail needs no zoom. */
  zooms: boolean;
  children: ReactNode;
}

/** A picture that can be made larger, and then moved about in its frame. */
export function ZoomFrame({ label, zooms, children }: ZoomFrameProps) {
  const [at, setAt] = useState(0);
  const zoom = steps[at] ?? 1;
  return (
    <div>
      <div
        className="max-h-[30rem] overflow-auto"
        // Scrolled with the arrow keys once it is larger than its frame.
        {...(zoom > 1 && { tabIndex: 0, role: 'region', 'aria-label': `${label}, enlarged` })}
      >
        <div
          className={zoom > 1 ? '' : '[&>svg]:max-h-[30rem]'}
          style={{ width: `${zoom * 100}%` }}
        >
          {children}
        </div>
      </div>
      {zooms && (
        <div className="no-print mt-1 flex justify-end gap-1">
          <ZoomButton
            word="Smaller"
            disabled={at === 0}
            onPress={() => setAt(at - 1)}
            icon={<ZoomOut size={18} aria-hidden="true" />}
          />
          <ZoomButton
            word="Larger"
            disabled={at === steps.length - 1}
            onPress={() => setAt(at + 1)}
            icon={<ZoomIn size={18} aria-hidden="true" />}
          />
        </div>
      )}
    </div>
  );
}

interface ZoomButtonProps {
  word: string;
  disabled: boolean;
  onPress: () => void;
  icon: ReactNode;
}

function ZoomButton({ word, disabled, onPress, icon }: ZoomButtonProps) {
  return (
    <button
      type="button"
      aria-label={word}
      title={word}
      aria-disabled={disabled}
      onClick={() => !disabled && onPress()}
      className="grid size-9 place-items-center rounded text-ink-soft hover:bg-manila aria-disabled:opacity-40"
    >
      {icon}
    </button>
  );
}
