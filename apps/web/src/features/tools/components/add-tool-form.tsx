import { addTool, type ToolReply } from '@hidewright/contract';
import { useWatch } from 'react-hook-form';
import { Form } from '../../../components/form.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { useAddTool } from '../tools.mutations.ts';
import { ofItsOwner } from '../typed-tool.ts';
import { ToolFields } from './tool-fields.tsx';

const kinds = [
  { value: 'cutting die', label: 'Cutting die', detail: 'cuts the outline' },
  { value: 'stamp plate', label: 'Stamp plate', detail: 'marks the artwork' },
];

interface AddToolFormProps {
  draftKey: string;
  /** For which pattern, where it is known already. */
  patternId: number | null;
  onAdded: (tool: ToolReply) => void;
}

export function AddToolForm({ draftKey, patternId, onAdded }: AddToolFormProps) {
  const send = useAddTool();
  return (
    <Form
      schema={addTool.body}
      defaults={{
        kind: 'cutting die',
        name: '',
        number: '',
        metal: '',
        cost: '',
        slot: '',
        patternId,
        customerId: null,
        ownedBy: 'shop',
        keptUntil: null,
        state: 'on the rack',
        piecesPerStrike: 1,
        ruleThicknessMm: null,
        borderMm: null,
        reliefAreaMm2: null,
      }}
      submitWord="Add the tool"
      draftKey={draftKey}
      onSend={async (body) =>
        onAdded(await send.mutateAsync({ body: ofItsOwner(ofItsKind(body)) }))
      }
    >
      <RadioCards name="kind" label="Kind" cards={kinds} across />
      <FieldsOfKind />
    </Form>
  );
}

function FieldsOfKind() {
  return <ToolFields kind={useWatch({ name: 'kind' }) as ToolReply['kind']} />;
}

/** What was chosen for a plate before it became a die is not sent. */
function ofItsKind<Body extends { kind: ToolReply['kind'] }>(body: Body): Body {
  return body.kind === 'cutting die'
    ? { ...body, metal: '', borderMm: null, reliefAreaMm2: null }
    : { ...body, piecesPerStrike: 1, ruleThicknessMm: null };
}
