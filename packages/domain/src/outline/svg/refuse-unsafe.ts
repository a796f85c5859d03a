import type { Element } from './read-elements.ts';
import { refusal } from './refusal.ts';

/**
 * Refuses what a drawing of an outline never needs: scripts, pictures, and whatever points outside
 * the file. Nothing of it would be followed anyway; a clear word is better than half a drawing.
 * @throws InvalidInput for `drawing`
 */
export function refuseUnsafe(root: Element): void {
  const waiting = [root];
  for (let element = waiting.pop(); element; element = waiting.pop()) {
    refuseElement(element);
    for (const [name, value] of element.attributes) refuseAttribute(element.name, name, value);
    waiting.push(...element.children);
  }
}

function refuseElement({ name, text }: Element): void {
  if (name.toLowerCase() === 'script') {
    throw refusal('The drawing holds a script. Save it as plain SVG, without scripts.');
  }
  if (name === 'image' || name === 'feImage') {
    throw refusal('The drawing holds a picture. Trace it to curves, and take the picture out.');
  }
  if (name === 'style' && /@import/i.test(text)) throw pointsOutside('style');
  if (name === 'style') refuseAddress(name, text);
}

function refuseAttribute(element: string, name: string, value: string): void {
  if (/^on[a-z]+$/i.test(name)) {
    throw refusal(`The drawing holds a script (${name}). Save it as plain SVG, without scripts.`);
  }
  if (/^(?:[\w.-]+:)?(?:href|src)$/i.test(name) && !value.trim().startsWith('#')) {
    throw pointsOutside(element);
  }
  refuseAddress(element, value);
}

/** Addresses in styles and attributes may name parts of the drawing itself only. */
function refuseAddress(element: string, value: string): void {
  for (const [, address] of value.matchAll(/url\(\s*["']?\s*([^)]?)/gi)) {
    if (address !== '#') throw pointsOutside(element);
  }
}

const pointsOutside = (element: string) =>
  refusal(
    `The drawing points to something outside the file (in <${element.slice(0, 40)}>). Take it out, and save it as plain SVG.`,
  );
