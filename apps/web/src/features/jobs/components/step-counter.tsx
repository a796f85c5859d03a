import type { JobStep } from '@hidewright/contract';
import { Minus, Plus } from 'lucide-react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import type { LogBody } from '../log-outbox.ts';
import {
  draftInWords,
  isMinutes,
  minutesToSend,
  useStepDraft,
  type StepDraft,
} from '../step-draft.ts';
import type { Refused } from '../use-log-outbox.ts';
import { QuickButtons } from './quick-buttons.tsx';
import { StepMinutes } from './step-minutes.tsx';

interface StepCounterProps {
  step: JobStep;
  perRow: number | null;
  perContainer: number;
  refused: Refused | undefined;
  onLog: (body: LogBody) => void;
}

/** For one thumb and wet hands: count, spoil, log. A tap too many is taken back with the minus. */
export function StepCounter({ step, perRow, perContainer, refused, onLog }: StepCounterProps) {
  const { draft, change, clear } = useStepDraft(step.id);
  const words = draftInWords(draft);
  const left =
    step.limit -
    step.good -
    step.rejects -
    step.seconds -
    draft.good -
    draft.rejects -
    draft.seconds;

  function send() {
    const { good, rejects, seconds, minutes } = draft;
    onLog({ stepId: step.id, good, rejects, seconds, minutes: minutesToSend(minutes) });
    clear();
  }

  return (
    <div className="space-y-3">
      {refused && <RefusedNotice refused={refused} onBack={(counts) => change(counts)} />}
      <Tally step={step} draft={draft} left={left} onGood={(good) => change({ good })} />
      <QuickButtons {...{ step, perRow, perContainer, left, draft, change }} />
      <StepMinutes draft={draft} change={change} />
      {words !== '' && (
        <Button
          tone="primary"
          size="bench"
          className="w-full"
          onClick={send}
          disabled={!isMinutes(draft.minutes)}
        >
          Log {words}
        </Button>
      )}
    </div>
  );
}

interface TallyProps {
  step: JobStep;
  draft: StepDraft;
  left: number;
  onGood: (good: number) => void;
}

function Tally({ step, draft, left, onGood }: TallyProps) {
  const good = step.good + draft.good;
  return (
    <div className="flex flex-wrap items-center gap-x-5 gap-y-2">
      <Button
        size="bench"
        className="min-w-15"
        aria-label="One good piece less"
        disabled={good <= 0}
        onClick={() => onGood(draft.good - 1)}
      >
        <Minus aria-hidden="true" />
      </Button>
      <output
        aria-label={`Good on ${step.name}`}
        className="min-w-16 text-center text-2xl font-bold"
      >
        {good}
      </output>
      <Button
        size="bench"
        className="min-w-15"
        aria-label="One good piece more"
        disabled={left <= 0}
        onClick={() => onGood(draft.good + 1)}
      >
        <Plus aria-hidden="true" />
      </Button>
      <span className="text-ink-soft">
        of {step.limit}
        {left > 0 && `, ${left} to go`}
      </span>
    </div>
  );
}

function RefusedNotice({
  refused,
  onBack,
}: {
  refused: Refused;
  onBack: (counts: Partial<StepDraft>) => void;
}) {
  const { good = 0, rejects = 0, seconds = 0, minutes = '0' } = refused.log.body;
  const counts = { good, rejects, seconds, minutes: minutes === '0' ? '' : minutes };
  return (
    <Notice
      tone="danger"
      live
      title={`Not logged: ${draftInWords({ ...counts, clockFrom: null })}.`}
      actions={<Button onClick={() => onBack(counts)}>Count on from there</Button>}
    >
      {refused.problem.detail}
    </Notice>
  );
}
