import type { Lot, LotDrawing } from '@hidewright/contract';
import { drawnAreaMm2, usualSide } from '@hidewright/domain';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { say } from '../../../components/toast.ts';
import { areaText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useDrawLot } from '../lots.mutations.ts';
import {
  withCorner,
  withFlawClosed,
  withoutFlaw,
  withOutlineCorner,
  type SideSketch,
} from '../side-sketch.ts';
import { useSidePhoto } from '../use-side-photo.ts';
import { FlawList } from './flaw-list.tsx';
import { PhotoPart } from './photo-part.tsx';
import { PhotoStrength } from './photo-strength.tsx';
import { SideCanvas } from './side-canvas.tsx';

/** Across, in mm: what a tap without a drawn line stands for. */
const tapMm = 40;

const parts = {
  flaws: {
    word: 'Flaws',
    help: 'Draw around each flaw, or tap it. With the keyboard: arrow keys, Enter for each corner, Space to close.',
  },
  edge: {
    word: 'Edge',
    help: 'Move the corners until the edge looks like the side on the table.',
  },
  photo: {
    word: 'Photo',
    help: 'A photo taken from straight above lies under the drawing, so that edge and flaws are drawn over it.',
  },
};

interface SideEditorProps {
  lot: Lot;
  drawing: LotDrawing;
  onDone: () => void;
}

/** Draws the edge of a side and its flaws, with mouse, finger or keyboard. */
export function SideEditor({ lot, drawing, onDone }: SideEditorProps) {
  const send = useDrawLot();
  const used = useSidePhoto(lot.id, drawing.photo);
  const [works, setWorks] = useState<keyof typeof parts>('flaws');
  const [strength, setStrength] = useState(70);
  const [sketch, setSketch] = useState<SideSketch>(() => startFrom(lot, drawing));
  const [saving, setSaving] = useState(false);
  const [wrong, setWrong] = useState<string>();
  const { outline, flaws } = sketch;

  async function save(edge: SideSketch['outline'] | null) {
    await send.mutateAsync({
      params: { id: lot.id },
      body: {
        outline: edge,
        flaws: edge ? flaws : [],
        usablePercent: drawing.usablePercent,
        photo: edge ? await used.keep() : null,
      },
      ifMatch: drawing.version,
    });
    say(
      edge ? `Lot ${lot.tag} is drawn with its flaws.` : `The drawing of ${lot.tag} is taken off.`,
    );
    onDone();
  }

  async function trySaving(edge: SideSketch['outline'] | null) {
    setSaving(true);
    setWrong(undefined);
    // What went wrong is shown; the sketch stays.
    await save(edge).catch((error: Error) => setWrong(error.message));
    setSaving(false);
  }

  return (
    <div className="space-y-3">
      <div className="flex flex-wrap gap-2" role="group" aria-label="What to draw">
        {(Object.keys(parts) as (keyof typeof parts)[]).map((part) => (
          <Button
            key={part}
            aria-pressed={works === part}
            className={works === part ? 'border-verdigris bg-verdigris-pale' : undefined}
            onClick={() => setWorks(part)}
          >
            {parts[part].word}
          </Button>
        ))}
      </div>
      <p className="text-sm text-ink-soft">{parts[works].help}</p>
      {works === 'photo' ? (
        <PhotoPart sketch={sketch} used={used} strength={strength} />
      ) : (
        <SideCanvas
          sketch={sketch}
          works={works}
          photo={strength > 0 ? used.photo : undefined}
          strength={strength}
          onCorner={(at) => setSketch((now) => withCorner(now, at))}
          onClose={() => setSketch((now) => withFlawClosed(now, tapMm))}
          onDrop={() => setSketch((now) => ({ ...now, underWay: [] }))}
          onMoveCorner={(at, to) => setSketch((now) => withOutlineCorner(now, at, to))}
        />
      )}
      {used.photo && <PhotoStrength strength={strength} onChange={setStrength} />}
      <DrawnArea lot={lot} outline={outline} />
      <FlawList flaws={flaws} onRemove={(at) => setSketch((now) => withoutFlaw(now, at))} />
      {wrong && (
        <Notice tone="danger" live title="It is not saved.">
          {wrong}
        </Notice>
      )}
      <div className="flex flex-wrap gap-2">
        <Button tone="primary" busy={saving} onClick={() => void trySaving(outline)}>
          Save the drawing
        </Button>
        <Button onClick={onDone}>Leave it</Button>
        {drawing.outline !== null && (
          <Button tone="quiet" onClick={() => void trySaving(null)}>
            Take the drawing off
          </Button>
        )}
      </div>
    </div>
  );
}

function startFrom(lot: Lot, drawing: LotDrawing): SideSketch {
  const outline = drawing.outline ?? usualSide(Number(lot.measuredAreaMm2) / lot.pieces);
  return { outline, flaws: drawing.flaws, underWay: [] };
}

function DrawnArea({ lot, outline }: { lot: Lot; outline: SideSketch['outline'] }) {
  const { areaUnit } = useWorkshop();
  const drawn = areaText(drawnAreaMm2(outline).toFixed(3), areaUnit);
  const measured = areaText(lot.measuredAreaMm2, areaUnit);
  return <p className="text-sm text-ink-soft">{`${drawn} as drawn, ${measured} as measured`}</p>;
}
