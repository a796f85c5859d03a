import { Fragment } from 'react';
import type { ReplyOf, listOrderSuggestions } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';

interface UnclearNoticeProps {
  things: ReplyOf<typeof listOrderSuggestions>['unclear'];
}

/** What is left out of the list, so that nobody takes its silence for enough. */
export function UnclearNotice({ things }: UnclearNoticeProps) {
  if (things.length === 0) return null;
  return (
    <Notice tone="danger" className="mb-6" title="Not everything could be worked out.">
      Look yourself at{' '}
      {things.map(({ of, id, name }, at) => (
        <Fragment key={`${of} ${id}`}>
          {at > 0 && ', '}
          <TextLink to={`/stockroom/${of}/${id}`}>{name}</TextLink>
        </Fragment>
      ))}
      : check its pack, minimum and supplier. The program’s log says what went wrong.
    </Notice>
  );
}
