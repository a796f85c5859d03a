import { changeHardware, readHardware, type Hardware } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Checkbox } from '../../../components/checkbox.tsx';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeHardware } from '../hardware.mutations.ts';
import { hardwareQuery } from '../hardware.queries.ts';
import { HardwareFields } from './hardware-fields.tsx';

interface ChangeHardwareFormProps {
  hardware: Hardware;
  suppliers: readonly Choice[];
}

export function ChangeHardwareForm({ hardware, suppliers }: ChangeHardwareFormProps) {
  const send = useChangeHardware();
  const client = useQueryClient();
  const { queryKey } = hardwareQuery(hardware.id);

  async function reload() {
    const now = await call(readHardware, { params: { id: hardware.id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <Form
      schema={changeHardware.body}
      defaults={typedOf(hardware)}
      submitWord="Save"
      submitTone="secondary"
      draftKey={`hardware-${hardware.id}`}
      onReload={reload}
      onSend={async (body) => {
        const ifMatch = client.getQueryData<Hardware>(queryKey)?.version ?? hardware.version;
        const saved = await send.mutateAsync({ params: { id: hardware.id }, body, ifMatch });
        say(`${saved.name} is saved.`);
      }}
    >
      <HardwareFields suppliers={suppliers} own={hardware.id} />
      <Checkbox name="active" label="We still use it" />
    </Form>
  );
}

/** What the form asks for, from what is known of the hardware now. */
function typedOf(hardware: Hardware) {
  const { name, kind, unitPrice = '', packSize, reorderAt, supplierId, active } = hardware;
  const { unit, metal, colour, bin, fromCustomer, priceFromParts } = hardware;
  const { postLengthMm, stackMinMm, stackMaxMm, settingDie, settingDieHere } = hardware;
  return {
    ...{ name, kind, unitPrice, packSize, reorderAt, supplierId, active },
    ...{ unit, metal, colour, bin, fromCustomer, priceFromParts },
    ...{ postLengthMm, stackMinMm, stackMaxMm, settingDie, settingDieHere },
    parts: hardware.parts.map(({ hardwareId, quantity }) => ({ hardwareId, quantity })),
    standIns: hardware.standIns.map(({ hardwareId, bothWays }) => ({ hardwareId, bothWays })),
  };
}
