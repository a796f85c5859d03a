import { X } from 'lucide-react';
import { Link } from 'react-router-dom';
import { TextLink } from '../../../components/text-link.tsx';

export interface LedgerSubject {
  name: string;
  /** Null for who may not go there. */
  place: string | null;
}

/** Says that only the movements of one thing are shown, and takes that back. */
export function OnlyOf({ subject, without }: { subject: LedgerSubject; without: string }) {
  const { name, place } = subject;
  return (
    <p className="no-print mb-4 inline-flex max-w-full flex-wrap items-center gap-x-2 rounded border border-edge bg-card pl-3">
      <span>
        Only {place === null ? <strong>{name}</strong> : <TextLink to={place}>{name}</TextLink>}
      </span>
      <Link
        to={without}
        aria-label={`Show everything, not only ${name}`}
        className="grid size-11 place-items-center rounded text-ink-soft hover:bg-manila"
      >
        <X size={18} aria-hidden="true" />
      </Link>
    </p>
  );
}
