import { invoiceState, type InvoiceState } from '@hidewright/contract';
import { Link } from 'react-router-dom';
import { classNames } from '../../../lib/class-names.ts';

const place = '/books/invoices';
/** Nothing is credited yet by this program. */
const states = invoiceState.options.filter((state) => state !== 'credited');

/** The invoices of one state, or all of them; the address tells which. */
export function InvoiceStateFilter({ chosen }: { chosen: InvoiceState | undefined }) {
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
