import { addTaxRate, changeTaxRate } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddTaxRate = () => useSend(addTaxRate);

export const useChangeTaxRate = () => useSend(changeTaxRate);
