/** What has come between a delivery and its cost: some of it was used, or a newer layer lies on it. */
export type MovedSince = 'used' | 'more came';

interface Line {
  lot_tag: string | null;
  name: string;
  moved_since: MovedSince | null;
}

/** Why what a delivery cost cannot be put right any more, and what becomes of a late bill; null while it can be. */
export function whyCostStays(lines: readonly Line[]): string | null {
  const [used, more] = [namesOf(lines, 'used'), namesOf(lines, 'more came')];
  if (used === '' && more === '') return null;
  const why =
    used === ''
      ? `More has come since, and stock is valued first in, first out: ${more}.`
      : `Some of it has moved since (taken, counted or sent back): ${used}.`;
  return `${why} What it cost stays as it is. Give a bill that comes now to the bookkeeper: it is an expense of its own.`;
}

function namesOf(lines: readonly Line[], moved: MovedSince): string {
  const names = lines
    .filter((line) => line.moved_since === moved)
    .map((line) => line.lot_tag ?? line.name);
  return [...new Set(names)].join(', ');
}
