import { lockPeriod } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useLockPeriod = () => useSend(lockPeriod);
