import type { ToDo } from '@hidewright/contract';
import type { Work } from '../../work.ts';
import type { Role, Row } from './to-do-source.ts';
import { sources } from './to-do-sources.ts';

/** What waits for this role: late things first, otherwise in the order of the sources. */
export async function toDos(work: Work, role: Role): Promise<ToDo[]> {
  const all: ToDo[] = [];
  for (const source of sources.filter((each) => each.roles.includes(role))) {
    const { sql, bindings } = withDay(source.sql, work.today);
    const rows = await work.em.execute<Row[]>(sql, bindings);
    all.push(...rows.map((row) => source.say(row, work.today)));
  }
  if (all.length === 0 && role === 'owner') return firstSteps(work);
  return [...all.filter((toDo) => toDo.late), ...all.filter((toDo) => !toDo.late)];
}

function withDay(sql: string, today: string): { sql: string; bindings: string[] } {
  const bindings = [...sql.matchAll(/:today/g)].map(() => today);
  return { sql: sql.replaceAll(':today', '?'), bindings };
}

/** A new shop is told how to get to its first quote. */
async function firstSteps(work: Work): Promise<ToDo[]> {
  const [made] = await work.em.execute<[{ patterns: number; quotes: number }]>(
    'SELECT (SELECT COUNT(*) FROM pattern) AS patterns, (SELECT COUNT(*) FROM quote) AS quotes',
  );
  if (made.quotes > 0) return [];
  const step = { kind: 'start' as const, when: null, late: false };
  if (made.patterns === 0) {
    return [
      {
        ...step,
        title: 'Begin with a pattern',
        detail: 'Draw the piece, or type how many a panel gives; then quote it.',
        action: 'New pattern',
        to: '/pattern-room/patterns/new',
      },
    ];
  }
  return [
    {
      ...step,
      title: 'Quote your first run',
      detail: 'Pick the pattern and type the quantities.',
      action: 'New quote',
      to: '/counter/quotes/new',
    },
  ];
}
