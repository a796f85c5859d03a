import {
  addSupplierOffer,
  adoptSupplierOffer,
  changeSupplierOffer,
  removeSupplierOffer,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddSupplierOffer = () => useSend(addSupplierOffer);

export const useChangeSupplierOffer = () => useSend(changeSupplierOffer);

export const useRemoveSupplierOffer = () => useSend(removeSupplierOffer);

export const useAdoptSupplierOffer = () => useSend(adoptSupplierOffer);
