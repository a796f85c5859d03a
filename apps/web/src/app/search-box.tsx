import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { Search } from 'lucide-react';
import { useDeferredValue, useId, useState, type KeyboardEvent } from 'react';
import { useNavigate } from 'react-router-dom';
import { searchQuery } from './search.queries.ts';
import { SearchResult } from './search-result.tsx';

/** A combobox over what the workshop holds: arrows move, Enter goes there. */
export function SearchBox({ onDone }: { onDone: () => void }) {
  const [typed, setTyped] = useState('');
  const [active, setActive] = useState(0);
  const navigate = useNavigate();
  const id = useId();
  const wanted = useDeferredValue(typed.trim());
  const { data, isError } = useQuery({ ...searchQuery(wanted), placeholderData: keepPreviousData });
  const items = wanted === '' ? [] : (data?.items ?? []);
  const current = items[Math.min(active, items.length - 1)];

  function go(to: string) {
    onDone();
    void navigate(to);
  }

  function onKey(event: KeyboardEvent) {
    if (items.length === 0) return;
    const last = items.length - 1;
    const moves: Record<string, number> = {
      ArrowDown: active >= last ? 0 : active + 1,
      ArrowUp: active <= 0 ? last : active - 1,
    };
    const next = moves[event.key];
    if (next !== undefined) {
      event.preventDefault();
      setActive(next);
      document.getElementById(`${id}-${next}`)?.scrollIntoView({ block: 'nearest' });
    } else if (event.key === 'Enter' && current) {
      event.preventDefault();
      go(current.to);
    }
  }

  return (
    <>
      <div className="flex items-center">
        <Search size={20} aria-hidden="true" className="ml-4 shrink-0 text-ink-soft" />
        <input
          type="text"
          role="combobox"
          aria-label="Find a number, customer, pattern or tag"
          aria-expanded={items.length > 0}
          aria-controls={`${id}-list`}
          aria-autocomplete="list"
          aria-activedescendant={current ? `${id}-${items.indexOf(current)}` : undefined}
          autoComplete="off"
          spellCheck={false}
          placeholder="Q-0241, a customer, a pattern, a hide’s tag"
          value={typed}
          onChange={(event) => {
            setTyped(event.target.value);
            setActive(0);
          }}
          onKeyDown={onKey}
          className="min-h-14 min-w-0 grow bg-transparent px-3 text-lg outline-none"
        />
      </div>
      <div aria-hidden="true" className="stitched h-0.5" />
      <ul
        id={`${id}-list`}
        role="listbox"
        aria-label="Found"
        className="max-h-[60dvh] overflow-y-auto p-1.5 empty:hidden"
      >
        {items.map((item, index) => (
          <SearchResult
            key={item.to}
            id={`${id}-${index}`}
            item={item}
            active={item === current}
            onPoint={() => setActive(index)}
            onChoose={() => go(item.to)}
          />
        ))}
      </ul>
      <p role="status" className="px-4 py-3 text-sm text-ink-soft">
        {sentenceFor(wanted, items.length, isError)}
      </p>
    </>
  );
}

function sentenceFor(wanted: string, found: number, failed: boolean): string {
  if (failed) return 'The search did not answer. Try again in a moment.';
  if (wanted === '') return 'Type part of a number or a name.';
  if (found === 0) return `Nothing found for “${wanted}”.`;
  return found === 1
    ? 'One found. Enter goes there.'
    : `${found} found. Arrows move, Enter goes there.`;
}
