import type { Role } from '@hidewright/contract';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { useSignIn } from '../session.mutations.ts';

interface DemoPerson {
  name: string;
  role: Role;
  comesTo: string;
}

const password = 'marlpit-by-the-fen';

const people: readonly DemoPerson[] = [
  { name: 'Ines Okafor-Lund', role: 'owner', comesTo: 'quotes, takes on, buys, prices' },
  { name: 'Tobias Wren', role: 'maker', comesTo: 'works the tickets, counts, takes from the rack' },
  { name: 'Maud Achterberg', role: 'bookkeeper', comesTo: 'invoices, payments, sales sheets' },
];

/** In the demo workshop, one press signs in as each of the three. */
export function DemoSignIns({ onSignedIn }: { onSignedIn: () => void }) {
  const send = useSignIn();
  const signInAs = (role: Role) =>
    send.mutate({ body: { email: `${role}@example.com`, password } }, { onSuccess: onSignedIn });
  const busy = send.isPending ? send.variables.body.email : undefined;
  return (
    <div className="space-y-2">
      {send.error && (
        <Notice tone="danger" live>
          {send.error instanceof ApiProblem ? send.error.detail : 'That did not work. Try again.'}
        </Notice>
      )}
      {people.map((person) => (
        <Button
          key={person.role}
          busy={busy === `${person.role}@example.com`}
          onClick={() => signInAs(person.role)}
          className="w-full justify-start text-left"
        >
          <span className="py-1.5">
            {person.name}, {person.role}
            <span className="block text-sm font-normal text-ink-soft">{person.comesTo}</span>
          </span>
        </Button>
      ))}
    </div>
  );
}
