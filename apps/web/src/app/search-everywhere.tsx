import { Dialog } from '@base-ui/react/dialog';
import { Search } from 'lucide-react';
import { useEffect, useState } from 'react';
import { SearchBox } from './search-box.tsx';

/** The field in the header; it opens, or Ctrl-K does, a search over everything that has a number or a name. */
export function SearchEverywhere() {
  const [open, setOpen] = useState(false);

  useEffect(() => {
    function onKey(event: KeyboardEvent) {
      if (event.key.toLowerCase() !== 'k' || !(event.ctrlKey || event.metaKey) || event.altKey)
        return;
      event.preventDefault();
      setOpen(true);
    }
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);

  return (
    <Dialog.Root open={open} onOpenChange={setOpen}>
      <Dialog.Trigger
        aria-keyshortcuts="Control+K"
        className="flex size-10 shrink-0 items-center justify-center gap-2 rounded text-ink-soft hover:bg-stitch/20 md:h-9 md:w-64 md:justify-start md:border md:border-edge md:bg-card md:px-3 lg:w-96"
      >
        <Search size={18} aria-hidden="true" className="shrink-0" />
        <span className="sr-only grow truncate text-left text-sm md:not-sr-only">
          Find a number, customer, pattern, tag…
        </span>
        <kbd
          aria-hidden="true"
          className="hidden rounded border border-stitch px-1.5 font-sans text-sm whitespace-nowrap lg:block"
        >
          Ctrl K
        </kbd>
      </Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Backdrop className="fixed inset-0 z-40 bg-[rgb(35_32_27/0.45)]" />
        <Dialog.Popup className="fixed top-[8dvh] left-1/2 z-50 w-[min(40rem,calc(100vw-1.5rem))] -translate-x-1/2 overflow-hidden rounded bg-card shadow-top outline-none">
          <Dialog.Title className="sr-only">Find anything</Dialog.Title>
          <SearchBox onDone={() => setOpen(false)} />
        </Dialog.Popup>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
