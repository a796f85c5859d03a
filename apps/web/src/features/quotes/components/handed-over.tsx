import { quotePaper } from '@hidewright/contract';
import { useId } from 'react';
import { addressOf } from '../../../lib/api.ts';
import { CopyButton } from './copy-button.tsx';

interface HandedOverProps {
  quoteId: number;
  linkUrl: string;
  text: string;
}

/** What the owner needs to pass a quote on: the link, the words, and the paper. */
export function HandedOver({ quoteId, linkUrl, text }: HandedOverProps) {
  const id = useId();
  return (
    <div className="space-y-4">
      <p>The link is shown this once. Pass it on with the text, or with the paper.</p>
      <div>
        <label htmlFor={`${id}-link`} className="mb-1 block font-semibold">
          Link for the customer
        </label>
        <input
          id={`${id}-link`}
          readOnly
          value={linkUrl}
          onFocus={(event) => event.currentTarget.select()}
          className="mb-2 w-full rounded border border-edge bg-card px-3 py-1.5"
        />
        <CopyButton text={linkUrl} word="Copy the link" />
      </div>
      <div>
        <label htmlFor={`${id}-text`} className="mb-1 block font-semibold">
          Text
        </label>
        <textarea
          id={`${id}-text`}
          readOnly
          rows={10}
          value={text}
          className="mb-2 w-full rounded border border-edge bg-card px-3 py-1.5"
        />
        <CopyButton text={text} word="Copy the text" />
      </div>
      <p>
        <a
          href={addressOf(quotePaper, { params: { id: quoteId } })}
          download
          className="font-semibold text-verdigris underline underline-offset-3"
        >
          Download the quote as PDF
        </a>
      </p>
    </div>
  );
}
