import type { ToolForRun } from '@hidewright/contract';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { toolTitle } from '../tool-words.ts';
import { Wear } from './wear.tsx';

/** One die or plate of a run: its sentence, its wear, and what a new one would cost. */
export function ToolForRunItem({ found }: { found: ToolForRun }) {
  const { currency } = useWorkshop();
  const { kind, tool, enough, onOrder, sentence, newCost } = found;
  const waits = tool === null && onOrder !== null;
  return (
    <li>
      <h3 className="flex flex-wrap items-center gap-2 font-semibold">
        {tool === null ? (
          kind === 'cutting die' ? (
            'Cutting die'
          ) : (
            'Stamp plate'
          )
        ) : (
          <TextLink to={`/pattern-room/tooling/${tool.id}`}>{toolTitle(tool)}</TextLink>
        )}
        <StateMark state={enough ? 'received' : waits ? 'on order' : 'short'}>
          {enough ? 'enough' : waits ? 'on order' : tool === null ? 'not here' : 'not enough'}
        </StateMark>
      </h3>
      <p className="mt-1 mb-2">{sentence}</p>
      {tool && <Wear tool={tool} />}
      {newCost !== null && !enough && (
        <p className="mt-1 text-ink-soft">
          What a new one would cost: {moneyText(newCost)} {currency}
        </p>
      )}
    </li>
  );
}
