import { useEffect, useRef } from 'react';
import { OctagonAlert } from 'lucide-react';

interface SummaryError {
  /** The field it belongs to, if it is on the page. */
  fieldId?: string | undefined;
  message: string;
}

interface ErrorSummaryProps {
  title: string;
  errors: readonly SummaryError[];
  /** Changes with each attempt: the summary takes the focus anew. */
  attempt: number;
}

/** What must change before it can be sent, with the way to each field; takes the focus. */
export function ErrorSummary({ title, errors, attempt }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), [attempt]);
  return (
    <div
      ref={box}
      tabIndex={-1}
      role="alert"
      className="flex max-w-xl gap-3 rounded border-2 border-oxblood bg-oxblood-pale px-3.5 py-3"
    >
      <OctagonAlert size={20} aria-hidden="true" className="mt-0.5 shrink-0 text-oxblood" />
      <div>
        <p className="font-semibold">{title}</p>
        {errors.length > 0 && (
          <ul className="mt-1 space-y-1">
            {errors.map((error) => (
              <li key={`${error.fieldId} ${error.message}`}>
                <SummaryLine error={error} />
              </li>
            ))}
          </ul>
        )}
      </div>
    </div>
  );
}

function SummaryLine({ error }: { error: SummaryError }) {
  const { fieldId, message } = error;
  if (fieldId === undefined || !document.getElementById(fieldId)) return message;
  return (
    <a
      href={`#${fieldId}`}
      className="font-semibold underline underline-offset-3"
      onClick={(event) => {
        event.preventDefault();
        goTo(fieldId);
      }}
    >
      {message}
    </a>
  );
}

/** A field that stands in something closed is opened first. */
function goTo(fieldId: string): void {
  const field = document.getElementById(fieldId);
  for (let around = field?.closest('details'); around;) {
    around.open = true;
    around = around.parentElement?.closest('details') ?? null;
  }
  field?.focus();
}
