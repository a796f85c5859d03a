import { deepest, mostCharacters, mostElements, refusal } from './refusal.ts';

/** One element of a drawing. Prefixes are left out of its name; attributes keep theirs. */
export interface Element {
  name: string;
  attributes: ReadonlyMap<string, string>;
  children: Element[];
  /** the text directly inside, which only style sheets need */
  text: string;
}

/**
 * Reads the elements of an SVG text in one pass. Document types, entities of the file's own and
 * references to style sheets are refused, since nothing outside the file is ever read.
 * @throws InvalidInput for `drawing`, naming the line
 */
export function readElements(text: string): Element {
  if (text.length > mostCharacters) {
    throw refusal('The drawing is larger than 5 MB. Leave only what is cut in it.');
  }
  const top: Element = { name: '', attributes: new Map(), children: [], text: '' };
  const open = [top];
  let count = 0;
  let at = text.startsWith('\uFEFF') ? 1 : 0;
  while (at < text.length) {
    const next = text.indexOf('<', at);
    const inside = open.at(-1) as Element;
    if (inside.name === 'style') inside.text += text.slice(at, next === -1 ? text.length : next);
    if (next === -1) break;
    const skipped = afterAside(text, next, inside);
    if (skipped !== null) {
      at = skipped;
      continue;
    }
    const tag = readTag(text, next);
    at = tag.end;
    if (tag.kind === 'end') closeElement(open, tag.name, text, next);
    else {
      count += 1;
      if (count > mostElements)
        throw refusal(`The drawing has more than ${mostElements} elements.`);
      const element = { name: tag.name, attributes: tag.attributes, children: [], text: '' };
      inside.children.push(element);
      if (tag.kind === 'start') open.push(element);
      if (open.length > deepest) throw refusal('The drawing is nested too deeply to be read.');
    }
  }
  if (open.length > 1) {
    throw refusal(`The drawing ends before its <${open.at(-1)?.name}> is closed. Save it again.`);
  }
  return rootOf(top);
}

function rootOf({ children }: Element): Element {
  const [root] = children;
  if (root?.name === 'svg' && children.length === 1) return root;
  throw refusal('This is not an SVG drawing. Save the drawing as SVG and choose that file.');
}

function closeElement(open: Element[], name: string, text: string, at: number): void {
  if (open.length > 1 && open.at(-1)?.name === name) open.pop();
  else throw unsound(text, at);
}

/** Where a comment, an instruction or character data at this place ends; null at an ordinary tag. */
function afterAside(text: string, at: number, inside: Element): number | null {
  if (text.startsWith('<!--', at)) return after(text, '-->', at);
  if (text.startsWith('<![CDATA[', at)) {
    const end = after(text, ']]>', at);
    if (inside.name === 'style') inside.text += text.slice(at + 9, end - 3);
    return end;
  }
  if (text.startsWith('<!', at)) {
    throw refusal(
      `The drawing declares a document type or entities on line ${lineOf(text, at)}. ` +
        'Save it as plain SVG, without them.',
    );
  }
  if (!text.startsWith('<?', at)) return null;
  if (text.startsWith('<?xml-stylesheet', at)) {
    throw refusal('The drawing refers to a style sheet outside the file. Save it as plain SVG.');
  }
  return after(text, '?>', at);
}

function after(text: string, mark: string, from: number): number {
  const at = text.indexOf(mark, from);
  if (at === -1) throw unsound(text, from);
  return at + mark.length;
}

type Tag =
  | { kind: 'end'; name: string; end: number }
  | { kind: 'start' | 'whole'; name: string; attributes: Map<string, string>; end: number };

const endTag = /<\/(?:[\w.-]+:)?([\w.-]+)\s*>/y;
const startTag = /<(?:[\w.-]+:)?([\w.-]+)/y;
const attribute = /\s+([^\s=/<>"']+)\s*=\s*(?:"([^"<]*)"|'([^'<]*)')/y;
const tagEnd = /\s*(\/?)>/y;

function readTag(text: string, at: number): Tag {
  const ending = match(endTag, text, at);
  if (ending) return { kind: 'end', name: ending[1] as string, end: endTag.lastIndex };
  const start = match(startTag, text, at);
  if (!start) throw unsound(text, at);
  const attributes = new Map<string, string>();
  let end = startTag.lastIndex;
  for (let found = match(attribute, text, end); found; found = match(attribute, text, end)) {
    attributes.set(found[1] as string, decoded(found[2] ?? found[3] ?? ''));
    end = attribute.lastIndex;
  }
  const closing = match(tagEnd, text, end);
  if (!closing) throw unsound(text, at);
  const kind = closing[1] === '/' ? 'whole' : 'start';
  return { kind, name: start[1] as string, attributes, end: tagEnd.lastIndex };
}

function match(pattern: RegExp, text: string, at: number): RegExpExecArray | null {
  pattern.lastIndex = at;
  return pattern.exec(text);
}

const entities: Record<string, string> = { lt: '<', gt: '>', amp: '&', quot: '"', apos: "'" };

function decoded(value: string): string {
  if (!value.includes('&')) return value;
  return value.replaceAll(/&(#x[0-9a-f]{1,6}|#\d{1,7}|\w{1,8});/gi, (whole, name: string) => {
    const code = name.startsWith('#x') ? parseInt(name.slice(2), 16) : Number(name.slice(1));
    if (!name.startsWith('#')) return entities[name] ?? whole;
    return code <= 0x10ffff ? String.fromCodePoint(code) : whole;
  });
}

const unsound = (text: string, at: number) =>
  refusal(`The drawing cannot be read from line ${lineOf(text, at)} on. Save it as SVG again.`);

const lineOf = (text: string, at: number): number => text.slice(0, at).split('\n').length;
