const longest = 60;
const bin = /^B-0*([1-9]\d{0,8})$/i;

/**
 * The tag in what a scanner or a person typed: the bare tag, or the last part of an address that a phone's own camera
 * can open (…/t/T-0012). Blanks around it and what scanners append are dropped; undefined where nothing readable is
 * left, or more than 60 characters.
 */
export function scannedTag(text: string): string | undefined {
  const [, last] = /\/t\/([^/?#]+)\/?(?:[?#].*)?$/i.exec(text.trim()) ?? [];
  const tag = decoded(last ?? text)
    .replaceAll(/\p{Cc}/gu, ' ')
    .trim();
  return tag === '' || tag.length > longest ? undefined : tag;
}

function decoded(part: string): string {
  try {
    return decodeURIComponent(part);
  } catch {
    return part;
  }
}

/** The address on a tag: where the workshop is reached, and the tag. */
export function tagAddress(publicUrl: string, tag: string): string {
  return `${publicUrl.replace(/\/$/, '')}/t/${encodeURIComponent(tag)}`;
}

/** The tag of a bin of hardware or supplies, by the hardware's id: B-0012. */
export function binTag(hardwareId: number): string {
  return `B-${String(hardwareId).padStart(4, '0')}`;
}

/** The id of the hardware whose bin carries a tag; undefined where it is no bin's tag. */
export function hardwareOfBin(tag: string): number | undefined {
  const [, id] = bin.exec(tag) ?? [];
  return id === undefined ? undefined : Number(id);
}
