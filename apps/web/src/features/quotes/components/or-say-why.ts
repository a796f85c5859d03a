import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';

/** Does what a press asks for; a refusal is said in the API's own words. */
export async function orSayWhy(act: () => Promise<unknown>): Promise<void> {
  try {
    await act();
  } catch (error) {
    say(error instanceof ApiProblem ? error.detail : 'That did not work. Try again in a moment.');
  }
}
