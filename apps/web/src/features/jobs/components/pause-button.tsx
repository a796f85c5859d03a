import type { Job } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { usePauseJob, useResumeJob } from '../jobs.mutations.ts';

/** Lays the job aside, or goes on with it. */
export function PauseButton({ job }: { job: Job }) {
  const pause = usePauseJob();
  const resume = useResumeJob();
  const input = { params: { id: job.id }, body: {} };
  if (job.orderState === 'cancelled') return null;
  if (job.state === 'at the bench') {
    return (
      <Button className="min-h-11" busy={pause.isPending} onClick={() => pause.mutate(input)}>
        Pause
      </Button>
    );
  }
  if (job.state !== 'paused') return null;
  return (
    <Button
      tone="primary"
      className="min-h-11"
      busy={resume.isPending}
      onClick={() => resume.mutate(input)}
    >
      Resume
    </Button>
  );
}
