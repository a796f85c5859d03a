import { ChevronDown } from 'lucide-react';
import type { MouseEvent } from 'react';
import { matchPath, NavLink, useLocation } from 'react-router-dom';

export interface SectionLink {
  to: string;
  word: string;
  /** Only when exactly there, not in the places below it. */
  end?: boolean | undefined;
}

interface SectionNavProps {
  label: string;
  items: readonly SectionLink[];
}

/** As many places as a phone shows side by side. */
const many = 4;

/** The places within a room; the one where the person stands is underlined by a stitch. On a phone, many are folded away. */
export function SectionNav({ label, items }: SectionNavProps) {
  const folds = items.length > many;
  return (
    <nav aria-label={label} className="no-print -mx-1 mb-5 px-1 pt-1 max-sm:overflow-x-auto">
      {folds && <FoldedPlaces label={label} items={items} />}
      <ul className={`flex gap-1 sm:flex-wrap ${folds ? 'max-sm:hidden' : ''}`}>
        {items.map((item) => (
          <li key={item.to}>
            <PlaceLink item={item} />
          </li>
        ))}
      </ul>
    </nav>
  );
}

/** Where the person stands, and behind it everywhere else in the room. */
function FoldedPlaces({ label, items }: SectionNavProps) {
  const { pathname } = useLocation();
  const here = items.find(({ to, end = false }) => matchPath({ path: to, end }, pathname));
  return (
    <details className="group sm:hidden">
      <summary className="flex min-h-11 items-center justify-between gap-3 rounded border border-edge bg-card px-3">
        <span>
          <span className="text-ink-soft">{label}: </span>
          <span className="font-semibold">{here?.word ?? 'choose a place'}</span>
        </span>
        <ChevronDown size={18} aria-hidden="true" className="group-open:rotate-180" />
      </summary>
      <ul className="grid grid-cols-2 gap-1 pt-2">
        {items.map((item) => (
          <li key={item.to}>
            <PlaceLink item={item} onClick={foldUp} />
          </li>
        ))}
      </ul>
    </details>
  );
}

/** One room's page may stay in place while the person goes on. */
function foldUp({ currentTarget }: MouseEvent<HTMLElement>): void {
  currentTarget.closest('details')?.removeAttribute('open');
}

interface PlaceLinkProps {
  item: SectionLink;
  onClick?: (event: MouseEvent<HTMLElement>) => void;
}

function PlaceLink({ item, onClick }: PlaceLinkProps) {
  return (
    <NavLink to={item.to} end={item.end ?? false} className={linkLook} onClick={onClick}>
      {item.word}
    </NavLink>
  );
}

function linkLook({ isActive }: { isActive: boolean }): string {
  const base = 'block px-3 py-2 bg-bottom rounded sm:whitespace-nowrap';
  return isActive
    ? `${base} stitched-act bg-[length:100%_2px] bg-no-repeat font-semibold text-verdigris`
    : `${base} text-ink-soft hover:text-ink hover:bg-stitch/20`;
}
