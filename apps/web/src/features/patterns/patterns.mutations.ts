import {
  addHardware,
  addLeather,
  addPattern,
  addTimeReadings,
  adviseCut,
  changePattern,
  dropDesign,
  takeLearned,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddPattern = () => useSend(addPattern);

export const useChangePattern = () => useSend(changePattern);

export const useTakeLearned = () => useSend(takeLearned);

export const useDropDesign = () => useSend(dropDesign);

export const useAddTimeReadings = () => useSend(addTimeReadings);

export const useAddLeather = () => useSend(addLeather);

export const useAddHardware = () => useSend(addHardware);

/** It only reckons: nothing that is shown elsewhere changes. */
export const useAdviseCut = () => useSend(adviseCut, { invalidates: [] });
