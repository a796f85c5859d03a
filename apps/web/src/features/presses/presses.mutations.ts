import { addPress, changePress } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddPress = () => useSend(addPress);

export const useChangePress = () => useSend(changePress);
