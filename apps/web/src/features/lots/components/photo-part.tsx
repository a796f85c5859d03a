import type { Point } from '@hidewright/domain';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { SidePaths } from '../../../components/side-paths.tsx';
import { sizeText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { carried, photoBox, trueToScale, type SidePhoto } from '../side-photo.ts';
import { boxOf, viewBoxOf, type SideSketch } from '../side-sketch.ts';
import type { UsedPhoto } from '../use-side-photo.ts';
import { PhotoCanvas } from './photo-canvas.tsx';
import { PhotoFileField } from './photo-file-field.tsx';
import { PhotoScaleForm } from './photo-scale-form.tsx';

interface PhotoPartProps {
  sketch: SideSketch;
  used: UsedPhoto;
  strength: number;
}

/** Choosing the photo, saying how large it is, and moving it under the drawing. */
export function PhotoPart({ sketch, used, strength }: PhotoPartProps) {
  const { photo, refusal, setPhoto, choose } = used;
  const [hand, setHand] = useState<'measure' | 'move'>('measure');
  const [line, setLine] = useState<Point[]>([]);

  function place(next: SidePhoto) {
    if (photo) setLine(carried(line, photo, next));
    setPhoto(next);
  }

  return (
    <>
      {photo ? (
        <PhotoCanvas
          key={photo.url}
          {...{ sketch, photo, strength, hand, line }}
          onLine={setLine}
          onMove={place}
        />
      ) : (
        <svg
          viewBox={viewBoxOf(boxOf(sketch.outline))}
          className="block h-auto max-h-[32rem] w-full rounded bg-paper"
          aria-hidden="true"
        >
          <SidePaths side={sketch} />
        </svg>
      )}
      <PhotoFileField
        refusal={refusal}
        onChoose={(file) => {
          setLine([]);
          void choose(file, sketch.outline);
        }}
      />
      {photo && (
        <>
          <Hands hand={hand} onHand={setHand} onTakeOff={() => setPhoto(undefined)} />
          {hand === 'measure' && (
            <PhotoScaleForm
              drawn={line.length === 2}
              onLength={(lengthMm) => {
                const scaled = trueToScale(photo, line as [Point, Point], lengthMm);
                if (scaled) place(scaled);
                return scaled !== undefined;
              }}
            />
          )}
          <PhotoSize photo={photo} />
        </>
      )}
    </>
  );
}

interface HandsProps {
  hand: 'measure' | 'move';
  onHand: (hand: 'measure' | 'move') => void;
  onTakeOff: () => void;
}

const handWords = { measure: 'Measure', move: 'Move' } as const;

function Hands({ hand, onHand, onTakeOff }: HandsProps) {
  return (
    <div className="flex flex-wrap gap-2" role="group" aria-label="What to do with the photo">
      {(['measure', 'move'] as const).map((each) => (
        <Button
          key={each}
          aria-pressed={hand === each}
          className={hand === each ? 'border-verdigris bg-verdigris-pale' : undefined}
          onClick={() => onHand(each)}
        >
          {handWords[each]}
        </Button>
      ))}
      <Button tone="quiet" onClick={onTakeOff}>
        Take the photo off
      </Button>
    </div>
  );
}

function PhotoSize({ photo }: { photo: SidePhoto }) {
  const { lengthUnit } = useWorkshop();
  const { width, height } = photoBox(photo);
  const size = sizeText(width.toFixed(1), height.toFixed(1), lengthUnit);
  return (
    <Notice>{`The whole photo shows ${size}. A line of known length that you draw on it makes that true.`}</Notice>
  );
}
