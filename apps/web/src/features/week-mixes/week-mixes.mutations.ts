import { workOutWeekMix } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

/** It only reckons: nothing that is shown elsewhere changes. */
export const useWorkOutWeekMix = () => useSend(workOutWeekMix, { invalidates: [] });
