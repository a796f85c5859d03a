/** Lots by their tags, in a sentence: A, B and C. */
export function tagWords(tags: readonly string[]): string {
  return tags.length < 2
    ? tags.join('')
    : `${tags.slice(0, -1).join(', ')} and ${tags.at(-1) ?? ''}`;
}
