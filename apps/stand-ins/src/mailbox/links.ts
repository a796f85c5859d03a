const address = /https?:\/\/[^\s<>"'`]+/g;

/** A full stop or a closing bracket after an address belongs to the sentence, not to the address. */
const sentenceEnd = /[.,;:!?)\]}]+$/;

export interface TextPart {
  text: string;
  href?: string;
}

/** Cuts a text into what is an address and what is not, losing nothing. */
export function splitAtLinks(text: string): TextPart[] {
  const parts: TextPart[] = [];
  let from = 0;
  for (const match of text.matchAll(address)) {
    const href = match[0].replace(sentenceEnd, '');
    if (match.index > from) parts.push({ text: text.slice(from, match.index) });
    parts.push({ text: href, href });
    from = match.index + href.length;
  }
  if (from < text.length) parts.push({ text: text.slice(from) });
  return parts;
}

/** Every address once, in the order of the text and then of the HTML part. */
export function linksIn(text: string, html = ''): string[] {
  const inText = splitAtLinks(text).flatMap((part) => part.href ?? []);
  const inHtml = [...html.matchAll(/href="(https?:[^"]+)"/g)].flatMap((match) =>
    match[1] === undefined ? [] : match[1].replaceAll('&amp;', '&'),
  );
  return [...new Set([...inText, ...inHtml])];
}
