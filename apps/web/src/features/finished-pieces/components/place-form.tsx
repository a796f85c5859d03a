import { changeFinishedPiece, readFinishedPiece, type FinishedPiece } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeFinished } from '../finished-pieces.mutations.ts';
import { finishedPieceQuery } from '../finished-pieces.queries.ts';

/** Where the pieces lie. */
export function PlaceForm({ piece }: { piece: FinishedPiece }) {
  const send = useChangeFinished();
  const client = useQueryClient();
  const { queryKey } = finishedPieceQuery(piece.id);

  async function reload() {
    const now = await call(readFinishedPiece, { params: { id: piece.id } });
    client.setQueryData(queryKey, now);
    return { place: now.place };
  }

  return (
    <Form
      schema={changeFinishedPiece.body}
      defaults={{ place: piece.place }}
      submitWord="Save"
      submitSize="bench"
      submitTone="secondary"
      onReload={reload}
      onSend={async (body) => {
        const ifMatch = client.getQueryData<FinishedPiece>(queryKey)?.version ?? piece.version;
        await send.mutateAsync({ params: { id: piece.id }, body, ifMatch });
        say('The place is saved.');
      }}
    >
      <TextField name="place" label="Place" optional help="Such as tray 3, or the shop window." />
    </Form>
  );
}
