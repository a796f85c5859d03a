import type { CheckAnswer, RunCheck } from '@hidewright/contract';
import { Notice } from '../../../components/notice.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';

/** Each answer in a sentence, and the lots to go to; where something is short, with the way to put it right. */
export function CheckAnswers({ check }: { check: RunCheck }) {
  return (
    <>
      <ul className="my-4 divide-y divide-stitch/60" aria-label="Answers">
        {check.answers.map((answer) => (
          <li key={`${answer.about} ${answer.name}`} className="py-2.5">
            <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
              <StateMark state={answer.enough ? 'received' : 'short'}>
                {answer.enough ? 'enough' : 'short'}
              </StateMark>
              <span className="min-w-0 grow basis-64">{answer.sentence}</span>
              {!answer.enough && <Remedy answer={answer} />}
            </div>
            {answer.about === 'leather' && <Lots lots={check.lots} />}
          </li>
        ))}
      </ul>
      <PatternRemarks check={check} />
      {check.notes.map((note) => (
        <p key={note} className="mb-2 text-ink-soft">
          {note}
        </p>
      ))}
    </>
  );
}

function PatternRemarks({ check: { remarks, patternId } }: { check: RunCheck }) {
  if (remarks.length === 0) return null;
  return (
    <Notice
      tone="attention"
      className="mb-4"
      actions={<TextLink to={`/pattern-room/patterns/${patternId}`}>Pattern</TextLink>}
    >
      {remarks.map((remark) => (
        <p key={remark}>{remark}</p>
      ))}
    </Notice>
  );
}

function Lots({ lots }: Pick<RunCheck, 'lots'>) {
  if (lots.length === 0) return null;
  return (
    <ul className="mt-2 space-y-1 pl-4 text-ink-soft" aria-label="From these lots">
      {lots.map(({ lotId, tag, place, shade, sentence }) => (
        <li key={lotId}>
          <TextLink to={`/stockroom/lots/${lotId}`}>{tag}</TextLink>
          {[place, shade].filter(Boolean).map((word) => `, ${word}`)}
          {`: ${sentence}`}
        </li>
      ))}
    </ul>
  );
}

/** Where what is no hardware is put right. */
const remedies: Partial<Record<CheckAnswer['about'], { to: string; word: string }>> = {
  leather: { to: '/stockroom', word: 'Stockroom' },
  tooling: { to: '/pattern-room', word: 'Pattern room' },
  hours: { to: '/bench', word: 'Bench' },
};

function Remedy({ answer: { about, hardwareId } }: { answer: CheckAnswer }) {
  const remedy =
    hardwareId === null
      ? remedies[about]
      : { to: `/stockroom/hardware/${hardwareId}`, word: 'Stockroom' };
  return remedy && <TextLink to={remedy.to}>{remedy.word}</TextLink>;
}
