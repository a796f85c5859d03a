import type { ToDo } from '@hidewright/contract';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { Ticket } from '../../../components/ticket.tsx';
import { dayText } from '../../../lib/formatting.ts';

/** What waits, each on a ticket with the one thing to do about it. */
export function ToDoList({ toDos, today }: { toDos: readonly ToDo[]; today: string }) {
  if (toDos.length === 0) {
    return <EmptyState title="Nothing waits">Everything that came in has been seen to.</EmptyState>;
  }
  return (
    <ul className="space-y-2">
      {toDos.map((toDo, index) => (
        <li key={`${toDo.to} ${toDo.title}`}>
          <Ticket
            level={3}
            title={toDo.title}
            detail={<Detail toDo={toDo} today={today} />}
            actions={
              <LinkButton
                to={toDo.to}
                tone={index === 0 ? 'primary' : 'secondary'}
                aria-label={`${toDo.action}: ${toDo.detail}`}
              >
                {toDo.action}
              </LinkButton>
            }
          />
        </li>
      ))}
    </ul>
  );
}

function Detail({ toDo, today }: { toDo: ToDo; today: string }) {
  return (
    <>
      <span className="block text-base text-ink">{toDo.detail}</span>
      {toDo.when && (
        <span>
          {toDo.when.word} {dayText(toDo.when.day, today)}
        </span>
      )}
      {toDo.late && <StateMark state="late" className="ml-2" />}
    </>
  );
}
