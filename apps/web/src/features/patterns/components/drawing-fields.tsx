import type { ClosedCurve, Drawing } from '@hidewright/domain';
import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Checkbox } from '../../../components/checkbox.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { Notice } from '../../../components/notice.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { curveWords } from '../curve-words.ts';
import { holeName } from '../drawn-outline.ts';
import type { UsedDrawing } from '../use-drawing.ts';
import { CurveMark } from './curve-mark.tsx';
import { DrawingFileField } from './drawing-file-field.tsx';

/** An outline from a file: which of its curves the die cuts, how wide it is, and which holes it punches. */
export function DrawingFields({ opened, drawn, refusal, open }: UsedDrawing) {
  const points = useWatch({ name: 'definition.outline.points' }) as unknown[] | undefined;
  const keptBefore = opened === undefined && (points?.length ?? 0) > 0;
  return (
    <>
      <DrawingFileField fileName={opened?.fileName} refusal={refusal} onOpen={open} />
      {keptBefore && (
        <p className="max-w-xl text-ink-soft">
          The outline kept so far stands beside. Another file takes its place.
        </p>
      )}
      {drawn !== undefined && (
        <>
          <LeftOut {...drawn.drawing} />
          <CurveCards {...drawn.drawing} />
          {opened?.drawing.needsWidth && (
            <LengthField
              name="definition.outline.knownWidthMm"
              label="Width of the piece"
              help="The file says no size: how wide is the curve chosen?"
              whenEmpty="text"
            />
          )}
          {drawn.chosen && drawn.holes.length > 0 && (
            <HoleFields chosen={drawn.chosen} holes={drawn.holes} unit={drawn.drawing.unit} />
          )}
          {drawn.refusal !== undefined && (
            <Notice tone="danger" live className="max-w-xl">
              {drawn.refusal}
            </Notice>
          )}
        </>
      )}
    </>
  );
}

function LeftOut({ leftOut, open }: Drawing) {
  const openWords =
    open.length === 0
      ? []
      : [`${open.length === 1 ? '1 line is' : `${open.length} lines are`} open, and left out.`];
  const sentences = [...leftOut, ...openWords];
  if (sentences.length === 0) return null;
  return <Notice className="max-w-xl">{sentences.join(' ')}</Notice>;
}

const fewCurves = 6;

/** The largest few; the rest, which is mostly lettering, when it is asked for. */
function CurveCards({ closed, unit }: Drawing) {
  const { lengthUnit } = useWorkshop();
  const [all, setAll] = useState(false);
  const [largest] = closed;
  if (largest === undefined) return null;
  const cards = closed.slice(0, all ? closed.length : fewCurves).map((curve) => ({
    value: curve.id,
    label: curveWords(curve, unit, lengthUnit),
    detail: curve === largest ? 'the largest' : undefined,
    aside: <CurveMark curve={curve} within={largest} />,
  }));
  return (
    <div className="space-y-2">
      <RadioCards
        name="definition.outline.curve"
        label="Which curve does the die cut?"
        cards={cards}
      />
      {closed.length > cards.length && (
        <Button tone="quiet" onClick={() => setAll(true)}>
          Show all {closed.length} curves
        </Button>
      )}
    </div>
  );
}

interface HoleFieldsProps {
  chosen: ClosedCurve;
  holes: ClosedCurve[];
  unit: Drawing['unit'];
}

/** What lies in the chosen curve: holes and slots, but also lettering and guides, so each is asked for. */
function HoleFields({ chosen, holes, unit }: HoleFieldsProps) {
  const { lengthUnit } = useWorkshop();
  const [all, setAll] = useState(false);
  const shown = all ? holes : holes.slice(0, 2 * fewCurves);
  return (
    <fieldset className="max-w-xl space-y-1">
      <legend className="mb-1 font-semibold">Holes and slots punched with it</legend>
      {shown.map((hole) => (
        <Checkbox
          key={`${chosen.id} ${hole.id}`}
          name={`definition.outline.kept.${holeName(hole.id)}`}
          label={
            <span className="flex items-center gap-3">
              <CurveMark curve={hole} within={chosen} />
              {curveWords(hole, unit, lengthUnit)}
            </span>
          }
        />
      ))}
      {holes.length > shown.length && (
        <Button tone="quiet" onClick={() => setAll(true)}>
          Show all {holes.length}
        </Button>
      )}
    </fieldset>
  );
}
