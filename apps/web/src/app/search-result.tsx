import type { Found } from '@hidewright/contract';

interface SearchResultProps {
  id: string;
  item: Found;
  active: boolean;
  onPoint: () => void;
  onChoose: () => void;
}

/** One thing that was found: what kind it is, its name or number, and a word more. */
export function SearchResult({ id, item, active, onPoint, onChoose }: SearchResultProps) {
  return (
    // The input keeps the focus and the keys; a pointer may choose as well.
    <li
      id={id}
      role="option"
      aria-selected={active}
      onPointerMove={onPoint}
      onClick={onChoose}
      onKeyDown={undefined}
      className={`flex min-h-11 cursor-pointer items-center gap-4 rounded px-3 py-1.5 ${active ? 'bg-verdigris-pale' : ''}`}
    >
      <span className="w-24 shrink-0 text-sm text-ink-soft">{item.kind}</span>
      <span className="min-w-0 grow">
        <span className="block truncate font-semibold">{item.label}</span>
        {item.detail && <span className="block truncate text-sm text-ink-soft">{item.detail}</span>}
      </span>
    </li>
  );
}
