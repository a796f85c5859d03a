import { addCustomer, changeCustomer } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddCustomer = () => useSend(addCustomer);

export const useChangeCustomer = () => useSend(changeCustomer);
