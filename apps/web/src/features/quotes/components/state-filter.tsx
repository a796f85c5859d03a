import { quoteStates, type QuoteState } from '@hidewright/contract';
import { Link } from 'react-router-dom';
import { classNames } from '../../../lib/class-names.ts';

/** The quotes of one state, or all of them; the address tells which. */
export function StateFilter({ chosen }: { chosen: QuoteState | undefined }) {
  return (
    <nav aria-label="By state" className="no-print mb-4">
      <ul className="flex flex-wrap gap-1.5">
        {[undefined, ...quoteStates].map((state) => (
          <li key={state ?? 'all'}>
            <Link
              to={state === undefined ? '/counter/quotes' : `/counter/quotes?state=${state}`}
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
