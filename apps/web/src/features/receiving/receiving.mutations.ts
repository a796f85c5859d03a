import { receiveDelivery } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useReceiveDelivery = () => useSend(receiveDelivery);
