import { addImpressions, addTool, changeTool } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddTool = () => useSend(addTool);

export const useChangeTool = () => useSend(changeTool);

export const useAddImpressions = () => useSend(addImpressions);
