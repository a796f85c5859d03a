import { checkRuns, draftShort } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

/** Asking changes nothing, so nothing has to be read again. */
export const useCheckRuns = () => useSend(checkRuns, { invalidates: [] });
export const useDraftShort = () => useSend(draftShort);
