import { changeTool, readTool, type ToolReply } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeTool } from '../tools.mutations.ts';
import { toolQuery } from '../tools.queries.ts';
import { toolTitle } from '../tool-words.ts';
import { ofItsOwner } from '../typed-tool.ts';
import { ToolFields } from './tool-fields.tsx';

export function ChangeToolForm({ tool }: { tool: ToolReply }) {
  const send = useChangeTool();
  const client = useQueryClient();
  const { queryKey } = toolQuery(tool.id);

  async function reload() {
    const now = await call(readTool, { params: { id: tool.id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <Form
      schema={changeTool.body}
      defaults={typedOf(tool)}
      submitWord="Save"
      draftKey={`tool-${tool.id}`}
      onReload={reload}
      onSend={async (body) => {
        const ifMatch = client.getQueryData<ToolReply>(queryKey)?.version ?? tool.version;
        const change = { params: { id: tool.id }, body: ofItsOwner(body), ifMatch };
        say(`${toolTitle(await send.mutateAsync(change))} is saved.`);
      }}
    >
      <ToolFields kind={tool.kind} from={tool.state} />
    </Form>
  );
}

function typedOf(tool: ToolReply) {
  const { name, number, metal, cost, lifeUses, slot, patternId, customerId, state } = tool;
  const { ownedBy, keptUntil, piecesPerStrike, ruleThicknessMm, borderMm, reliefAreaMm2 } = tool;
  return {
    ...{ name, number, metal, cost, lifeUses, slot, patternId, customerId, state },
    ...{ ownedBy, keptUntil, piecesPerStrike, ruleThicknessMm, borderMm, reliefAreaMm2 },
  };
}
