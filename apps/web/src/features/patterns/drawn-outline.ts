import {
  DomainError,
  holesWithin,
  outlineFromDrawing,
  readDrawing,
  type ClosedCurve,
  type Drawing,
  type DrawnPolygon,
} from '@hidewright/domain';

/** A file that was chosen, and what was found in it. */
export interface OpenedDrawing {
  fileName: string;
  text: string;
  drawing: Drawing;
}

/** What a person says about a drawing; as a form holds it, so that nothing of it is sure. */
export interface DrawingChoice {
  /** which curve the die cuts */
  curve: unknown;
  /** the holes that are kept, by `holeName` */
  kept: unknown;
  /** how wide that curve is, where the file says no unit */
  knownWidthMm: unknown;
}

/** What comes of a drawing and the choice: an outline, or the sentence that says why there is none yet. */
export interface DrawnOutline {
  /** With its size, once that is known. */
  drawing: Drawing;
  chosen: ClosedCurve | undefined;
  holes: ClosedCurve[];
  outline?: DrawnPolygon;
  refusal?: string;
}

export const holeName = (id: number): string => `hole${id}`;

/** @returns the sentence that says what is wrong with the file, where something is */
export function openDrawing(fileName: string, text: string): OpenedDrawing | string {
  try {
    const drawing = readDrawing(text);
    if (drawing.closed.length > 0) return { fileName, text, drawing };
    return drawing.open.length > 0
      ? `${fileName} holds only open lines, such as one that begins ${placeOf(drawing)}. Close the outline in the drawing.`
      : `${fileName} holds no curve. Draw the outline as a closed curve.`;
  } catch (error) {
    if (error instanceof DomainError) return error.message;
    throw error;
  }
}

function placeOf({ open, unit }: Drawing): string {
  const { x = 0, y = 0 } = open[0]?.from ?? {};
  return `near x ${x.toFixed(1)}, y ${y.toFixed(1)} ${unit}`;
}

export function drawnOutline(opened: OpenedDrawing, choice: DrawingChoice): DrawnOutline {
  const plain = chosenIn(opened.drawing, choice);
  if (plain.chosen === undefined) return plain;
  try {
    const now = chosenIn(sized(opened, plain.chosen.id, choice), choice);
    if (now.drawing.needsWidth) return now;
    return { ...now, ...outlineOrRefusal(now, choice) };
  } catch (error) {
    if (error instanceof DomainError) return { ...plain, refusal: error.message };
    throw error;
  }
}

function chosenIn(drawing: Drawing, { curve }: DrawingChoice): DrawnOutline {
  const chosen = drawing.closed.find(({ id }) => id === curve);
  return { drawing, chosen, holes: chosen ? holesWithin(drawing, chosen.id) : [] };
}

/** Once a width is typed, the file is read again at that size, so that its curves are followed as closely as any. */
function sized({ text, drawing }: OpenedDrawing, curve: number, choice: DrawingChoice): Drawing {
  const typed = choice.knownWidthMm;
  if (!drawing.needsWidth || typed === '' || typed === undefined || typed === null) return drawing;
  return readDrawing(text, { known: { widthMm: Number(typed), curve } });
}

function outlineOrRefusal(
  { drawing, chosen, holes }: DrawnOutline,
  { kept }: DrawingChoice,
): Pick<DrawnOutline, 'outline' | 'refusal'> {
  const ticked = (kept ?? {}) as Record<string, unknown>;
  const ids = holes.map(({ id }) => id).filter((id) => ticked[holeName(id)] === true);
  try {
    return { outline: outlineFromDrawing(drawing, chosen?.id ?? -1, ids) };
  } catch (error) {
    if (error instanceof DomainError) return { refusal: error.message };
    throw error;
  }
}
