import type { StockCount } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { countedText } from '../count-words.ts';
import { asTyped } from '../as-typed.ts';
import { forgetRefused, type RefusedEntry } from '../entry-outbox.ts';

interface RefusedEntriesProps {
  sheet: StockCount;
  person: string;
  refused: readonly RefusedEntry[];
}

/** What was typed here and is not on the sheet: nobody has to remember it. */
export function RefusedEntries({ sheet, person, refused }: RefusedEntriesProps) {
  const { areaUnit } = useWorkshop();
  if (refused.length === 0) return null;
  return (
    <Notice
      tone="danger"
      live
      title={refused.length === 1 ? 'A figure was refused.' : 'Some figures were refused.'}
      actions={
        <Button className="min-h-11" onClick={() => forgetRefused({ person, countId: sheet.id })}>
          I have noted it
        </Button>
      }
    >
      <ul className="mt-1 space-y-1">
        {refused.map((each) => {
          const line = sheet.lines.find(({ id }) => id === each.lineId);
          return (
            <li key={each.lineId}>
              {line && (
                <strong className="font-semibold">
                  {`${line.tag}, ${countedText(asTyped(line, each.entry), areaUnit)}: `}
                </strong>
              )}
              {each.why}
            </li>
          );
        })}
      </ul>
    </Notice>
  );
}
