import { NavLink } from 'react-router-dom';

export interface SectionLink {
  to: string;
  word: string;
  /** Only when exactly there, not in the places below it. */
  end?: boolean | undefined;
}

/** The places within a room; the one where the person stands is underlined by a stitch. */
export function SectionNav({ label, items }: { label: string; items: readonly SectionLink[] }) {
  return (
    <nav aria-label={label} className="no-print -mx-1 mb-5 overflow-x-auto px-1 pt-1">
      <ul className="flex gap-1">
        {items.map((item) => (
          <li key={item.to}>
            <NavLink to={item.to} end={item.end ?? false} className={linkLook}>
              {item.word}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function linkLook({ isActive }: { isActive: boolean }): string {
  const base = 'block px-3 py-2 whitespace-nowrap bg-bottom rounded';
  return isActive
    ? `${base} stitched-act bg-[length:100%_2px] bg-no-repeat font-semibold text-verdigris`
    : `${base} text-ink-soft hover:text-ink hover:bg-stitch/20`;
}
