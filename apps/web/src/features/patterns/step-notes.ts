interface Noted {
  people?: unknown;
  unattended?: unknown;
  shortestWait?: unknown;
  longestWait?: unknown;
  pieceRate?: unknown;
  per?: unknown;
}

const said = (value: unknown): boolean => value !== undefined && value !== null && value !== '';

/** What is particular about a step, in words: waits, people, piece rates. */
export function stepNotes(step: Noted): string {
  const { people, unattended, shortestWait, longestWait, pieceRate } = step;
  const notes = [
    said(people) && people !== 1 && `${String(people)} people`,
    unattended === true && 'nobody stands by',
    said(shortestWait) && `lies at least ${String(shortestWait)} min`,
    said(longestWait) && `lies at most ${String(longestWait)} min`,
    said(pieceRate) && `${String(pieceRate)} for each ${String(step.per)}`,
  ];
  return notes.filter((note) => note !== false).join(', ');
}
