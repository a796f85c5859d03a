import { addSupplier, changeSupplier } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddSupplier = () => useSend(addSupplier);

export const useChangeSupplier = () => useSend(changeSupplier);
