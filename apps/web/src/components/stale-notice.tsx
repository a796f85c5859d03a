import type { ProblemBody } from '@hidewright/contract';
import { instantText } from '../lib/formatting.ts';
import { useWorkshop } from '../lib/workshop.tsx';
import { Button } from './button.tsx';
import { Notice } from './notice.tsx';

interface StaleNoticeProps {
  changed: ProblemBody['changed'];
  onKeep: () => Promise<void>;
  onTake: () => Promise<void>;
}

/** Somebody else saved it meanwhile: says who and what, and lets the person choose. */
export function StaleNotice({ changed, onKeep, onTake }: StaleNoticeProps) {
  const { timeZone } = useWorkshop();
  return (
    <Notice
      tone="attention"
      live
      title={changed ? `${changed.by} changed this meanwhile.` : 'This was changed meanwhile.'}
      actions={
        <>
          <Button onClick={() => void onKeep()}>Keep what I typed</Button>
          <Button onClick={() => void onTake()}>Take what is there now</Button>
        </>
      }
    >
      {changed && `${changed.what}, ${instantText(changed.at, timeZone)}. `}
      Nothing of yours was saved yet. Keep what you typed and save again, or take what is there now.
    </Notice>
  );
}
