import {
  layoutAsked,
  layoutSourceOf,
  outline,
  outlineOf,
  type LayoutSource,
} from '@hidewright/contract';
import { outlinePath } from '@hidewright/domain';
import { useFormContext, useWatch } from 'react-hook-form';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { OutlinePicture } from '../../../components/outline-picture.tsx';
import { SearchProgress } from '../../../components/search-progress.tsx';
import { layoutSubtitle } from '../layout-words.ts';
import { layoutBody } from '../typed-pattern.ts';
import { useLayoutPreview } from '../use-layout-preview.ts';
import { LayoutDrawing } from './layout-drawing.tsx';

/** The outline and its layout, drawn while they are typed. */
export function LayoutPreview() {
  const definition = useWatch({ name: 'definition' }) as Record<string, unknown>;
  const name = String(useWatch({ name: 'name' }) ?? '');
  const asked = layoutBody(definition);
  const path = pathOf(asked['outline']);
  const source = sourceOf(asked);
  const { answer, working, searching } = useLayoutPreview(source);
  const { setValue } = useFormContext();
  const layout = answer !== undefined && 'layout' in answer ? answer.layout : undefined;
  return (
    <Card title="Layout" subtitle={layout ? layoutSubtitle(layout) : undefined}>
      <div aria-busy={working} className="space-y-5">
        {path !== null && (
          <OutlinePicture outlinePath={path} title="The outline" className="mx-auto max-w-48" />
        )}
        {searching && (
          <SearchProgress
            searching={searching}
            stopWord="Stop, rows will do"
            onStop={() => setValue('definition.layoutBy', 'outline', { shouldDirty: true })}
          />
        )}
        {answer !== undefined && 'refusal' in answer && (
          <Notice tone="attention">{answer.refusal}</Notice>
        )}
        {layout !== undefined && (
          <div>
            {working && !searching && (
              <p className="mb-3 text-ink-soft">Laying the pieces out again …</p>
            )}
            <LayoutDrawing layout={layout} outlinePath={drawnIn(source, path)} name={name} />
          </div>
        )}
        {answer === undefined && (
          <p className="text-ink-soft">
            {working
              ? 'Laying the pieces out …'
              : 'Type the measures, and the pieces are laid out here.'}
          </p>
        )}
      </div>
    </Card>
  );
}

function pathOf(typed: unknown): string | null {
  const parsed = outline.safeParse(typed);
  return parsed.success ? outlinePath(outlineOf(parsed.data)) : null;
}

function sourceOf(asked: unknown): LayoutSource | undefined {
  const parsed = layoutAsked.safeParse(asked);
  return parsed.success ? layoutSourceOf(parsed.data) : undefined;
}

const drawnIn = (source: LayoutSource | undefined, path: string | null) =>
  source?.by === 'outline' ? path : null;
