import type { CheckAnswer, RunCheck } from '@hidewright/contract';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';

/** Each answer in a sentence; where something is short, with the way to put it right. */
export function CheckAnswers({ check }: { check: RunCheck }) {
  return (
    <ul className="my-4 divide-y divide-stitch/60" aria-label="Answers">
      {check.answers.map((answer) => (
        <li
          key={`${answer.about} ${answer.name}`}
          className="flex flex-wrap items-baseline gap-x-3 gap-y-1 py-2.5"
        >
          <StateMark state={answer.enough ? 'received' : 'short'}>
            {answer.enough ? 'enough' : 'short'}
          </StateMark>
          <span className="min-w-0 grow basis-72">{answer.sentence}</span>
          {!answer.enough && <Remedy about={answer.about} />}
        </li>
      ))}
    </ul>
  );
}

const remedies: Record<CheckAnswer['about'], { to: string; word: string } | null> = {
  leather: { to: '/stockroom', word: 'Stockroom' },
  hardware: { to: '/stockroom', word: 'Stockroom' },
  tooling: { to: '/pattern-room', word: 'Pattern room' },
  hours: { to: '/bench', word: 'Bench' },
};

function Remedy({ about }: { about: CheckAnswer['about'] }) {
  const remedy = remedies[about];
  return remedy && <TextLink to={remedy.to}>{remedy.word}</TextLink>;
}
