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
import { FlawList } from './flaw-list.tsx';
import { SideCanvas } from './side-canvas.tsx';

/** Across, in mm: what a tap without a drawn line stands for. */
const tapMm = 40;

interface SideEditorProps {
  lot: Lot;
  drawing: LotDrawing;
  onDone: () => void;
}

/** Draws the edge of a side and its flaws, with mouse, finger or keyboard. */
export function SideEditor({ lot, drawing, onDone }: SideEditorProps) {
  const send = useDrawLot();
  const [works, setWorks] = useState<'flaws' | 'edge'>('flaws');
  const [sketch, setSketch] = useState<SideSketch>(() => startFrom(lot, drawing));
  const { outline, flaws } = sketch;

  async function save(edge: SideSketch['outline'] | null) {
    await send.mutateAsync({
      params: { id: lot.id },
      body: { outline: edge, flaws: edge ? flaws : [], usablePercent: drawing.usablePercent },
      ifMatch: drawing.version,
    });
    say(
      edge ? `Lot ${lot.tag} is drawn with its flaws.` : `The drawing of ${lot.tag} is taken off.`,
    );
    onDone();
  }

  return (
    <div className="space-y-3">
      <div className="flex flex-wrap gap-2" role="group" aria-label="What to draw">
        {(['flaws', 'edge'] as const).map((part) => (
          <Button
            key={part}
            aria-pressed={works === part}
            className={works === part ? 'border-verdigris bg-verdigris-pale' : undefined}
            onClick={() => setWorks(part)}
          >
            {part === 'flaws' ? 'Flaws' : 'Edge'}
          </Button>
        ))}
      </div>
      <p className="text-sm text-ink-soft">
        {works === 'flaws'
          ? 'Draw around each flaw, or tap it. With the keyboard: arrow keys, Enter for each corner, Space to close.'
          : 'Move the corners until the edge looks like the side on the table.'}
      </p>
      <SideCanvas
        sketch={sketch}
        works={works}
        onCorner={(at) => setSketch((now) => withCorner(now, at))}
        onClose={() => setSketch((now) => withFlawClosed(now, tapMm))}
        onDrop={() => setSketch((now) => ({ ...now, underWay: [] }))}
        onMoveCorner={(at, to) => setSketch((now) => withOutlineCorner(now, at, to))}
      />
      <DrawnArea lot={lot} outline={outline} />
      <FlawList flaws={flaws} onRemove={(at) => setSketch((now) => withoutFlaw(now, at))} />
      {send.error && (
        <Notice tone="danger" live title="It is not saved.">
          {send.error.message}
        </Notice>
      )}
      <div className="flex flex-wrap gap-2">
        <Button tone="primary" busy={send.isPending} onClick={() => void save(outline).catch(stay)}>
          Save the drawing
        </Button>
        <Button onClick={onDone}>Leave it</Button>
        {drawing.outline !== null && (
          <Button tone="quiet" onClick={() => void save(null).catch(stay)}>
            Take the drawing off
          </Button>
        )}
      </div>
    </div>
  );
}

/** What went wrong is shown; the sketch stays. */
const stay = () => undefined;

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
