import type { JobStep } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import type { StepDraft } from '../step-draft.ts';

interface QuickButtonsProps {
  step: JobStep;
  perRow: number | null;
  perContainer: number;
  /** How many can still be counted here. */
  left: number;
  draft: StepDraft;
  change: (changes: Partial<StepDraft>) => void;
}

/** One tap for a reject, a second, a row, a panel, or all that are left; and one to take a reject or second back. */
export function QuickButtons({
  step,
  perRow,
  perContainer,
  left,
  draft,
  change,
}: QuickButtonsProps) {
  const inPieces = step.per === 'piece' || step.per === 'strike';
  const none = left <= 0;
  const more = (field: 'good' | 'rejects' | 'seconds', count: number) =>
    change({ [field]: draft[field] + count });
  return (
    <>
      <div className="flex flex-wrap gap-2.5">
        <Button size="bench" className="grow" disabled={none} onClick={() => more('rejects', 1)}>
          Reject
        </Button>
        {inPieces && (
          <Button size="bench" className="grow" disabled={none} onClick={() => more('seconds', 1)}>
            Second
          </Button>
        )}
        {batches(inPieces, perRow, perContainer, left).map(({ word, count }, at) => (
          <Button
            key={word}
            size="bench"
            tone={at === 0 ? 'primary' : 'secondary'}
            className="grow"
            onClick={() => more('good', count)}
          >
            + {word} {count}
          </Button>
        ))}
      </div>
      <TakeBack step={step} draft={draft} more={more} />
    </>
  );
}

interface Batch {
  word: string;
  count: number;
}

/** A row, a panel, all: each only where it is more than the one before, and where there are so many. */
function batches(
  inPieces: boolean,
  perRow: number | null,
  perContainer: number,
  left: number,
): Batch[] {
  const wanted: Batch[] = [
    ...(inPieces
      ? [
          { word: 'row of', count: perRow ?? 0 },
          { word: 'panel of', count: perContainer },
        ]
      : []),
    { word: 'all', count: left },
  ];
  return wanted.filter(
    ({ count }, at) =>
      count > 1 && count <= left && wanted.findIndex((each) => each.count === count) === at,
  );
}

interface TakeBackProps {
  step: JobStep;
  draft: StepDraft;
  more: (field: 'rejects' | 'seconds', count: number) => void;
}

function TakeBack({ step, draft, more }: TakeBackProps) {
  const fields = (['rejects', 'seconds'] as const).filter(
    (field) => step[field] + draft[field] > 0,
  );
  if (fields.length === 0) return null;
  return (
    <div className="flex flex-wrap gap-2.5">
      {fields.map((field) => (
        <Button key={field} className="min-h-11" onClick={() => more(field, -1)}>
          − 1 {field === 'rejects' ? 'reject' : 'second'}
        </Button>
      ))}
    </div>
  );
}
