import type { Learned } from '@hidewright/contract';
import { useId, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { countText } from '../../../lib/formatting.ts';
import { notLogged, offeredBy, type Offered } from '../learned-words.ts';
import { useTakeLearned } from '../patterns.mutations.ts';

interface TakeLearnedProps {
  learned: Learned;
  without: readonly number[];
  /** The figures are still those of other runs. */
  waits: boolean;
}

const keyOf = ({ what, step, hardwareId }: Offered) => `${what} ${step ?? ''} ${hardwareId ?? ''}`;

/** The figures that can go into the pattern: all of them, or one by one. */
export function TakeLearned({ learned, without, waits }: TakeLearnedProps) {
  const send = useTakeLearned();
  const [left, setLeft] = useState<readonly string[]>([]);
  const [problem, setProblem] = useState<string>();
  const offered = offeredBy(learned);
  const taken = offered.filter((each) => !left.includes(keyOf(each)));
  const news = offered.some(({ changes }) => changes);
  const whose = learned.customers.find(({ id }) => id === learned.customerId)?.name;

  async function use() {
    setProblem(undefined);
    const take = taken.map(({ what, step, hardwareId }) => ({ what, step, hardwareId }));
    try {
      const { patternName, versionNumber } = await send.mutateAsync({
        params: { id: learned.patternId },
        body: { without: [...without], customerId: learned.customerId, take },
        ifMatch: learned.version,
      });
      say(
        whose === undefined
          ? `${patternName} goes by its last runs as version ${versionNumber}.`
          : `Quotes for ${whose} go by their own runs from now on.`,
      );
    } catch (error) {
      setProblem(error instanceof ApiProblem ? error.detail : 'This could not be sent. Try again.');
    }
  }

  const set = (each: Offered, on: boolean) =>
    setLeft(on ? left.filter((key) => key !== keyOf(each)) : [...left, keyOf(each)]);
  return (
    <Card
      title="Use these"
      subtitle={
        whose === undefined
          ? 'A new version of the pattern; quotes keep theirs.'
          : `For the next quotes of ${whose} alone; what is not ticked stays as the pattern has it.`
      }
    >
      {problem && (
        <Notice tone="danger" live className="mb-3">
          {problem}
        </Notice>
      )}
      {offered.length === 0 ? (
        <p className="text-ink-soft">No run that counts has logged minutes or rejects.</p>
      ) : (
        <ul>
          {offered.map((each) => (
            <OfferedRow
              key={keyOf(each)}
              offered={each}
              on={taken.includes(each)}
              onSet={(on) => set(each, on)}
            />
          ))}
        </ul>
      )}
      <Notes learned={learned} />
      {offered.length > 0 && !news && (
        <Notice tone="ok" className="mt-3">
          {whose === undefined
            ? `Version ${learned.versionNumber} says the same already.`
            : `Quotes for ${whose} say the same already.`}
        </Notice>
      )}
      {offered.length > 0 && (
        <Button
          tone="primary"
          className="mt-4"
          busy={send.isPending}
          disabled={taken.length === 0 || waits}
          onClick={() => void use()}
        >
          {taken.length === offered.length ? 'Use these' : `Use ${taken.length} of these`}
        </Button>
      )}
    </Card>
  );
}

interface OfferedRowProps {
  offered: Offered;
  on: boolean;
  onSet: (on: boolean) => void;
}

function OfferedRow({ offered, on, onSet }: OfferedRowProps) {
  const id = useId();
  const { name, now, found, behind, changes } = offered;
  return (
    <li className="stitched flex items-start gap-3 bg-[length:100%_2px] bg-top py-2.5 first:bg-none">
      <input
        id={id}
        type="checkbox"
        checked={on}
        onChange={(event) => onSet(event.target.checked)}
        aria-describedby={`${id}-behind`}
        className="mt-1 size-4.5 shrink-0 accent-verdigris"
      />
      <div className="min-w-0 grow">
        <label htmlFor={id} className="flex flex-wrap justify-between gap-x-4">
          <span className="font-semibold">{name}</span>
          <span>
            {changes && <span className="text-ink-soft">{`${now} → `}</span>}
            <span className="font-semibold">{found}</span>
            {!changes && <span className="text-ink-soft"> as it is</span>}
          </span>
        </label>
        <p id={`${id}-behind`} className="text-sm text-ink-soft">
          {behind}
        </p>
      </div>
    </li>
  );
}

function Notes({ learned }: { learned: Learned }) {
  const kept = notLogged(learned);
  const { good, of, uncounted } = learned.history;
  return (
    <div className="mt-3 space-y-1 text-sm text-ink-soft">
      {kept.length > 0 && (
        <p>{`No minutes logged, so the time stays as it is: ${kept.join(', ')}.`}</p>
      )}
      {good !== null && of !== null && (
        <p>
          {`With all rejects the pattern keeps the pieces behind them, ${countText(good)} good of ${countText(of)}, so that the cut count knows how sure they are.`}
        </p>
      )}
      {uncounted.length > 0 && learned.rejects.found !== null && (
        <p>
          {`Nobody counted at ${uncounted.join(', ')}: its rejects stay, and no pieces are kept behind them.`}
        </p>
      )}
    </div>
  );
}
