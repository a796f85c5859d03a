import type { ToolReply } from '@hidewright/contract';
import { StitchProgress } from '../../../components/stitch-progress.tsx';
import { usesWord, wearText } from '../tool-words.ts';

/** How much of its life a tool has given; said in words once it has given all. */
export function Wear({ tool }: { tool: ToolReply }) {
  return (
    <span className="inline-block w-48 max-w-full text-left">
      <StitchProgress
        label={`${usesWord(tool.kind)} used`}
        done={tool.used}
        of={tool.lifeUses}
        stitches={10}
      />
      <span className="mt-0.5 block text-sm">
        {wearText(tool)} {usesWord(tool.kind)}
        {tool.usesLeft === 0 && (
          <span className="block font-semibold text-brass">no life left</span>
        )}
      </span>
    </span>
  );
}
