import { addHardware, changeHardware } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddHardware = () => useSend(addHardware);

export const useChangeHardware = () => useSend(changeHardware);
