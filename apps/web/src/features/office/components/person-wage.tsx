import { changePerson, type Person } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { say } from '../../../components/toast.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { useChangePerson } from '../office.mutations.ts';
import { peopleQuery } from '../office.queries.ts';

/** What an hour of somebody's is paid; the shop's wage where nobody says. */
export function Wage({ person }: { person: Person }) {
  const [open, setOpen] = useState(false);
  return (
    <span className="flex items-center justify-end gap-3">
      {person.wagePerHour === null ? 'the shop’s wage' : moneyText(person.wagePerHour)}
      <Button tone="quiet" onClick={() => setOpen(true)}>
        Set
        <span className="sr-only"> the wage of {person.name}</span>
      </Button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title={`What an hour of ${person.name} is paid`}
        description="Hours that are logged from now on count at it, where estimate and fact are compared."
      >
        <WageForm person={person} onDone={() => setOpen(false)} />
      </Dialog>
    </span>
  );
}

function WageForm({ person, onDone }: { person: Person; onDone: () => void }) {
  const send = useChangePerson();
  const client = useQueryClient();
  const body = changePerson.body?.pick({ wagePerHour: true });
  return (
    <Form
      schema={body}
      defaults={{ wagePerHour: person.wagePerHour ?? '' }}
      submitWord="Keep"
      onSend={async ({ wagePerHour }) => {
        await send.mutateAsync({
          params: { id: person.id },
          body: { wagePerHour: wagePerHour ?? null },
          ifMatch: person.version,
        });
        say(`Kept for ${person.name}.`);
        onDone();
      }}
      onReload={async () => {
        const { items } = await client.fetchQuery(peopleQuery());
        return { wagePerHour: items.find(({ id }) => id === person.id)?.wagePerHour ?? '' };
      }}
    >
      <MoneyField
        name="wagePerHour"
        label="Wage"
        per="hour"
        optional
        help="Left empty, it is the shop’s wage."
      />
    </Form>
  );
}
