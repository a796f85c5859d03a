import type { Quote } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';

/** The same quote as it was before, or as it is being made anew. */
export function OtherRevisions({ quote }: { quote: Quote }) {
  if (quote.revisions.length === 0) return null;
  return (
    <Card title="Other revisions">
      <ul className="space-y-2">
        {quote.revisions.map(({ id, revision, state }) => (
          <li key={id} className="flex items-center gap-3">
            <TextLink to={`/counter/quotes/${id}`}>{`Revision ${revision}`}</TextLink>
            <StateMark state={state} />
          </li>
        ))}
      </ul>
    </Card>
  );
}
