import type { Container, LayoutInput, LayRules, Outline } from '@hidewright/domain';
import type { LayoutAsked, TypedContainer, TypedOutline } from './layouts.ts';

/** A hand count as the domain takes it. */
export interface HandCounted {
  pieces: number;
  widthMm: number;
  heightMm: number;
}

/** What the domain is asked: to lay out, or to take a hand count. */
export type LayoutSource =
  { by: 'outline'; input: LayoutInput } | { by: 'hand count'; counted: HandCounted };

/**
 * What a pattern's definition (or a request for a layout) asks of the domain. The page and the API both go
 * through here, so that a preview and the stored layout are asked the same question.
 * @throws {TypeError} when the part that drives the layout is missing, which the schema refuses beforehand
 */
export function layoutSourceOf(asked: LayoutAsked): LayoutSource {
  if (asked.layoutBy === 'hand count') {
    if (asked.handCount === null)
      throw new TypeError('A layout by hand count without a hand count');
    const { pieces, widthMm, heightMm } = asked.handCount;
    return {
      by: 'hand count',
      counted: { pieces, widthMm: Number(widthMm), heightMm: Number(heightMm) },
    };
  }
  if (asked.outline === null || asked.container === null) {
    throw new TypeError('A layout by outline without an outline or a container');
  }
  const input: LayoutInput = {
    ...layRulesOf(asked, asked.outline),
    ...(asked.layoutBy === 'best found' && { search: 'best' }),
    container: containerOf(asked.container),
  };
  return { by: 'outline', input };
}

/** How a pattern's pieces may lie, whatever they are cut from. */
export function layRulesOf(
  { turns, spacingMm, trimMm }: Pick<LayoutAsked, 'turns' | 'spacingMm' | 'trimMm'>,
  drawn: TypedOutline,
): LayRules {
  return {
    outline: outlineOf(drawn),
    turns,
    spacingMm: Number(spacingMm),
    trimMm: Number(trimMm),
  };
}

/** The outline as the domain takes it: measures in mm as numbers, since geometry is floating point. */
export function outlineOf(typed: TypedOutline): Outline {
  switch (typed.shape) {
    case 'round':
      return { shape: 'round', diameterMm: Number(typed.diameterMm) };
    case 'oval':
      return { shape: 'oval', widthMm: Number(typed.widthMm), heightMm: Number(typed.heightMm) };
    case 'rectangle':
      return {
        shape: 'rectangle',
        widthMm: Number(typed.widthMm),
        heightMm: Number(typed.heightMm),
        cornerRadiusMm: Number(typed.cornerRadiusMm),
      };
    case 'tag':
      return {
        shape: 'tag',
        lengthMm: Number(typed.lengthMm),
        widthMm: Number(typed.widthMm),
        neckLengthMm: Number(typed.neckLengthMm),
        neckWidthMm: Number(typed.neckWidthMm),
        cornerRadiusMm: Number(typed.cornerRadiusMm),
      };
    case 'polygon':
      return typed;
  }
}

function containerOf(typed: TypedContainer): Container {
  return typed.form === 'panel'
    ? { form: 'panel', widthMm: Number(typed.widthMm), heightMm: Number(typed.heightMm) }
    : { form: 'strip', widthMm: Number(typed.widthMm), lengthMm: Number(typed.lengthMm) };
}
