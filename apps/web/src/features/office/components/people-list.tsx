import type { Person } from '@hidewright/contract';
import { Button } from '../../../components/button.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { say } from '../../../components/toast.ts';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { Wage } from './person-wage.tsx';
import { useChangePerson } from '../office.mutations.ts';

const columns: readonly Column<Person>[] = [
  {
    id: 'name',
    header: 'Name',
    value: (person) => `${person.name} ${person.email}`,
    cell: (person) => (
      <span className="block">
        {person.name}
        <span className="block text-sm text-ink-soft">{person.email}</span>
      </span>
    ),
    onPhone: 'title',
  },
  { id: 'role', header: 'Role', value: (person) => person.role },
  {
    id: 'wage',
    header: 'Paid an hour',
    value: (person) => person.wagePerHour,
    cell: (person) => <Wage person={person} />,
    align: 'right',
  },
  {
    id: 'active',
    header: 'Access',
    value: (person) => (person.active ? 'signs in' : 'ended'),
    cell: (person) => <Access person={person} />,
    sortable: false,
  },
];

export function PeopleList({ people }: { people: readonly Person[] }) {
  return (
    <DataTable
      label="Who signs in"
      rows={people}
      rowId={(person) => person.id}
      columns={columns}
      empty={null}
      sortedBy={{ id: 'name' }}
    />
  );
}

function Access({ person }: { person: Person }) {
  const send = useChangePerson();
  const turn = (active: boolean) =>
    send.mutate(
      { params: { id: person.id }, body: { active }, ifMatch: person.version },
      {
        onSuccess: () =>
          say(
            active ? `${person.name} can sign in again.` : `${person.name} can no longer sign in.`,
          ),
        onError: (error) =>
          say(error instanceof ApiProblem ? error.detail : 'That did not work. Try again.'),
      },
    );
  return (
    <span className="flex items-center gap-3">
      {person.active ? 'signs in' : 'ended'}
      <Button tone="quiet" busy={send.isPending} onClick={() => turn(!person.active)}>
        {person.active ? 'End' : 'Give back'}
        <span className="sr-only"> the access of {person.name}</span>
      </Button>
    </span>
  );
}
