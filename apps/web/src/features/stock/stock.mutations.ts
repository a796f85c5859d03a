import { adjustStock } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAdjustStock = () => useSend(adjustStock);
