import { Link } from 'react-router-dom';
import { classNames } from '../lib/class-names.ts';

interface StateFilterProps {
  /** The list's own address. */
  place: string;
  states: readonly string[];
  chosen: string | undefined;
}

/** A list's rows of one state, or all of them; the address tells which. */
export function StateFilter({ place, states, chosen }: StateFilterProps) {
  return (
    <nav aria-label="By state" className="no-print mb-4">
      <ul className="flex flex-wrap gap-1.5">
        {[undefined, ...states].map((state) => (
          <li key={state ?? 'all'}>
            <Link
              to={state === undefined ? place : `${place}?state=${encodeURIComponent(state)}`}
              aria-current={state === chosen ? 'page' : undefined}
              className={classNames(
                'block rounded border px-3 py-1 text-sm',
                state === chosen
                  ? 'border-verdigris bg-verdigris-pale font-semibold'
                  : 'border-stitch text-ink-soft hover:border-edge hover:text-ink',
              )}
            >
              {state ?? 'all'}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
