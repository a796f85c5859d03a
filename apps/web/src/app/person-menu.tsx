import { Menu } from '@base-ui/react/menu';
import type { SignedIn } from '@hidewright/contract';
import { ChevronDown, LogOut } from 'lucide-react';
import { useState } from 'react';
import { say } from '../components/toast.ts';
import { useSignOut } from '../features/session/session.mutations.ts';
import { menuLook } from './menu-look.ts';

/** Who is signed in, and the way out. */
export function PersonMenu({ person }: { person: SignedIn }) {
  const signOut = useSignOut();
  // Within the header, so that the open menu belongs to a landmark.
  const [home, setHome] = useState<HTMLElement | null>(null);
  const leave = () =>
    signOut.mutate(
      {},
      { onError: () => say('You are still signed in: the workshop’s computer cannot be reached.') },
    );
  return (
    <Menu.Root>
      <div ref={setHome} />
      <Menu.Trigger className="flex min-h-10 shrink-0 items-center gap-2 rounded px-2 hover:bg-stitch/20 data-popup-open:bg-stitch/20">
        <span
          aria-hidden="true"
          className="grid size-8 place-items-center rounded-full border-2 border-brass bg-manila text-sm font-bold"
        >
          {initials(person.name)}
        </span>
        <span className="sr-only text-left leading-tight lg:not-sr-only">
          {person.name.split(' ')[0]}{' '}
          <span className="block text-sm text-ink-soft">{person.role}</span>
        </span>
        <ChevronDown size={16} aria-hidden="true" className="hidden text-ink-soft lg:block" />
      </Menu.Trigger>
      <Menu.Portal container={home}>
        <Menu.Positioner sideOffset={6} align="end" className="z-40 outline-none">
          <Menu.Popup className={menuLook.popup}>
            <Menu.Group>
              <Menu.GroupLabel className="px-3 py-2">
                <span className="block font-semibold">{person.name}</span>
                <span className="block text-sm text-ink-soft">{person.email}</span>
              </Menu.GroupLabel>
              <Menu.Item className={menuLook.item} onClick={leave}>
                <LogOut size={18} aria-hidden="true" />
                Sign out
              </Menu.Item>
            </Menu.Group>
          </Menu.Popup>
        </Menu.Positioner>
      </Menu.Portal>
    </Menu.Root>
  );
}

function initials(name: string): string {
  const words = name.split(/\s+/).filter(Boolean);
  const [first = '', last = ''] = [words[0], words.length > 1 ? words.at(-1) : ''];
  return (first.slice(0, 1) + last.slice(0, 1)).toLocaleUpperCase();
}
