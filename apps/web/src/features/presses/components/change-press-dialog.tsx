import { changePress, listPresses, type PressReply } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Checkbox } from '../../../components/checkbox.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangePress } from '../presses.mutations.ts';
import { pressesQuery } from '../presses.queries.ts';
import { PressFields } from './press-fields.tsx';

interface ChangePressDialogProps {
  press: PressReply;
  onClose: () => void;
}

export function ChangePressDialog({ press, onClose }: ChangePressDialogProps) {
  const send = useChangePress();
  const client = useQueryClient();
  const { queryKey } = pressesQuery();

  async function reload() {
    const now = await call(listPresses);
    client.setQueryData(queryKey, now);
    return typedOf(now.items.find(({ id }) => id === press.id) ?? press);
  }

  return (
    <Dialog open onOpenChange={onClose} title={press.name}>
      <Form
        schema={changePress.body}
        defaults={typedOf(press)}
        submitWord="Save"
        onReload={reload}
        onSend={async (body) => {
          const known = client.getQueryData(queryKey)?.items.find(({ id }) => id === press.id);
          const ifMatch = known?.version ?? press.version;
          const saved = await send.mutateAsync({ params: { id: press.id }, body, ifMatch });
          onClose();
          say(`${saved.name} is saved.`);
        }}
      >
        <PressFields />
        <Checkbox name="active" label="We still use it" />
      </Form>
    </Dialog>
  );
}

function typedOf({ id: _id, version: _version, ...typed }: PressReply) {
  return typed;
}
