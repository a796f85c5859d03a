import { X } from 'lucide-react';

/** Takes a line out of a list in a form. */
export function RemoveButton({ label, onRemove }: { label: string; onRemove: () => void }) {
  return (
    <button
      type="button"
      onClick={onRemove}
      aria-label={label}
      className="mt-7 grid size-10 place-items-center rounded text-ink-soft hover:bg-manila"
    >
      <X size={18} aria-hidden="true" />
    </button>
  );
}
