import { addLeather, changeLeather } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddLeather = () => useSend(addLeather);

export const useChangeLeather = () => useSend(changeLeather);
