import type { ToolReply } from '@hidewright/contract';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { say } from '../../../components/toast.ts';
import { useGiveBackTool, useScrapTool } from '../tools.mutations.ts';
import { toolTitle } from '../tool-words.ts';

type Act = 'give back' | 'scrap';

/** How a tool leaves the rack: a customer's own goes back, what is worn out is scrapped. */
export function ToolActs({ tool }: { tool: ToolReply }) {
  const [asked, ask] = useState<Act>();
  const giveBack = useGiveBackTool();
  const scrap = useScrapTool();
  const { id, state, ownedBy } = tool;
  const title = toolTitle(tool);
  const theirs = ownedBy === 'customer' && state === 'on the rack';
  if (state !== 'on the rack' && state !== 'on order') return null;

  async function confirm() {
    const send = asked === 'give back' ? giveBack : scrap;
    await send.mutateAsync({ params: { id }, body: {} });
    say(asked === 'give back' ? `${title} is given back.` : `${title} is scrapped.`);
  }

  return (
    <>
      {theirs && <Button onClick={() => ask('give back')}>Give it back</Button>}
      <Button onClick={() => ask('scrap')}>Scrap it</Button>
      <ConfirmDialog
        open={asked !== undefined}
        onOpenChange={() => ask(undefined)}
        title={asked === 'give back' ? `Give ${title} back?` : `Scrap ${title}?`}
        confirmWord={asked === 'give back' ? 'Give it back' : 'Scrap it'}
        tone={asked === 'scrap' ? 'danger' : 'primary'}
        onConfirm={confirm}
      >
        {asked === 'give back'
          ? `It goes to ${tool.customerName ?? 'the customer'}, and no job is given it any more. Put it on the rack again if it comes back.`
          : 'No job is given it any more, and it does not come back. What it did stays in its list.'}
      </ConfirmDialog>
    </>
  );
}
