import { changeLot } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useChangeLot = () => useSend(changeLot);
