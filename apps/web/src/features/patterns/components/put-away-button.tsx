import type { Pattern } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import { say, undoable } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useChangePattern } from '../patterns.mutations.ts';

/** A pattern that is made no more stays for the quotes that have it; new ones do not offer it. */
export function PutAwayButton({ pattern }: { pattern: Pattern }) {
  const send = useChangePattern();
  const set = (active: boolean, ifMatch: number) =>
    send.mutateAsync({ params: { id: pattern.id }, body: { active }, ifMatch });

  async function press() {
    try {
      const { active, version } = await set(!pattern.active, pattern.version);
      const sentence = active ? `${pattern.name} is back in use.` : `${pattern.name} is put away.`;
      undoable(sentence, async () => set(!active, version));
    } catch (error) {
      say(error instanceof ApiProblem ? error.detail : 'That did not work. Try again in a moment.');
    }
  }

  return (
    <Button busy={send.isPending} onClick={() => void press()}>
      {pattern.active ? 'Put away' : 'Bring back'}
    </Button>
  );
}
