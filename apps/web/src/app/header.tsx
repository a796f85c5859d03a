import type { SignedIn } from '@hidewright/contract';
import { Crumbs } from './crumbs.tsx';
import { PersonMenu } from './person-menu.tsx';
import { SearchEverywhere } from './search-everywhere.tsx';

/** Where one is, the way to anything else, and who is signed in. */
export function Header({ person }: { person: SignedIn }) {
  return (
    <header className="no-print flex min-h-14 items-center gap-3 py-2.5 md:min-h-16">
      <Crumbs />
      <SearchEverywhere />
      <PersonMenu person={person} />
    </header>
  );
}
