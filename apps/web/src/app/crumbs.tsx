import { Fragment } from 'react';
import { Link, useMatches } from 'react-router-dom';
import { useWorkshop } from '../lib/workshop.tsx';

interface CrumbHandle {
  /** This place's word, or how to tell it from what its loader gave. */
  crumb: string | ((data: unknown) => string);
}

function hasCrumb(handle: unknown): handle is CrumbHandle {
  return typeof handle === 'object' && handle !== null && 'crumb' in handle;
}

/** The way from the room to this place, from each route's `handle.crumb`. */
export function Crumbs() {
  const workshop = useWorkshop();
  const places = useMatches().flatMap(({ id, pathname, handle, loaderData }) => {
    if (!hasCrumb(handle)) return [];
    const { crumb } = handle;
    return [{ id, pathname, word: typeof crumb === 'function' ? crumb(loaderData) : crumb }];
  });
  // In the room itself its title says all; a crumb of one would only repeat it.
  if (places.length < 2)
    return <p className="min-w-0 grow truncate font-semibold">{workshop.name}</p>;
  return (
    <nav
      aria-label="Where you are"
      className="min-w-0 grow truncate text-sm text-ink-soft md:text-base"
    >
      {places.map((place, index) => (
        <Fragment key={place.id}>
          {index > 0 && <span aria-hidden="true"> / </span>}
          {index === places.length - 1 ? (
            <span aria-current="page">{place.word}</span>
          ) : (
            <Link
              to={place.pathname}
              className="rounded py-1.5 underline-offset-3 hover:text-ink hover:underline"
            >
              {place.word}
            </Link>
          )}
        </Fragment>
      ))}
    </nav>
  );
}
