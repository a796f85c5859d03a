/** A tag that led to nothing, for where the API's own sentence is not at hand. */
export function unknownTag(read: string): Error {
  return new Error(
    `“${read}” is on no lot, bin, order or ticket here. Scan it again, or type the tag as it is printed.`,
  );
}
