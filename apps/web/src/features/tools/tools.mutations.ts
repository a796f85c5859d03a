import {
  addImpressions,
  addPlateOffer,
  addTool,
  changePlateOffer,
  changeTool,
  giveBackTool,
  removePlateOffer,
  scrapTool,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddTool = () => useSend(addTool);

export const useChangeTool = () => useSend(changeTool);

export const useAddImpressions = () => useSend(addImpressions);

export const useGiveBackTool = () => useSend(giveBackTool);

export const useScrapTool = () => useSend(scrapTool);

export const useAddPlateOffer = () => useSend(addPlateOffer);

export const useChangePlateOffer = () => useSend(changePlateOffer);

export const useRemovePlateOffer = () => useSend(removePlateOffer);
