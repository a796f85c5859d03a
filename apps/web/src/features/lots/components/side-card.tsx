import type { Lot } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { SidePaths } from '../../../components/side-paths.tsx';
import { boxOf } from '../side-sketch.ts';
import { lotDrawingQuery } from '../lots.queries.ts';
import { UsableShareForm } from './usable-share-form.tsx';
import { SideEditor } from './side-editor.tsx';

/** The lot's edge and flaws, and drawing them. */
export function SideCard({ lot }: { lot: Lot }) {
  const { data: drawing } = useQuery(lotDrawingQuery(lot.id));
  const [editing, setEditing] = useState(false);
  if (!drawing) return null;
  const flaws = drawing.flaws.length;
  return (
    <Card
      title="Edge and flaws"
      subtitle={
        drawing.outline === null ? 'not drawn yet' : `${flaws} ${flaws === 1 ? 'flaw' : 'flaws'}`
      }
      aside={
        !editing && (
          <Button onClick={() => setEditing(true)}>
            {drawing.outline === null ? 'Draw it' : 'Change the drawing'}
          </Button>
        )
      }
    >
      {editing ? (
        <SideEditor
          key={drawing.version}
          lot={lot}
          drawing={drawing}
          onDone={() => setEditing(false)}
        />
      ) : (
        <>
          <Drawn outline={drawing.outline} flaws={drawing.flaws} />
          {drawing.outline === null && (
            <div className="mt-4">
              <UsableShareForm key={drawing.version} lot={lot} drawing={drawing} />
            </div>
          )}
        </>
      )}
    </Card>
  );
}

interface DrawnProps {
  outline: { x: number; y: number }[] | null;
  flaws: { x: number; y: number }[][];
}

function Drawn({ outline, flaws }: DrawnProps) {
  if (outline === null) {
    return (
      <p className="text-ink-soft">
        Drawn with its flaws, a layout shows how many pieces this one really gives.
      </p>
    );
  }
  const { x, y, width, height } = boxOf(outline);
  return (
    <svg
      role="img"
      aria-label={`The side as drawn, with ${flaws.length} flaws`}
      viewBox={`${x - 10} ${y - 10} ${width + 20} ${height + 20}`}
      className="block h-auto max-h-80 w-full"
    >
      <SidePaths side={{ outline, flaws }} />
    </svg>
  );
}
