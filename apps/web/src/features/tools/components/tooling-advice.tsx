import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Card } from '../../../components/card.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { Notice } from '../../../components/notice.tsx';
import { countText } from '../../../lib/formatting.ts';
import { toolingAdviceQuery, type AskedTooling } from '../tools.queries.ts';
import { MetalAdvice } from './metal-advice.tsx';
import { ToolForRunItem } from './tool-for-run.tsx';

interface ToolingAdviceProps extends AskedTooling {
  /** The metals stand open, as on a page of their own. */
  open?: boolean;
}

/** The die and the plate that are there for a run, whether they last, and which metal a new plate should be. */
export function ToolingAdvice({ open = false, ...asked }: ToolingAdviceProps) {
  const { data, isError } = useQuery(toolingAdviceQuery(asked));
  if (isError) {
    return (
      <Frame pieces={asked.pieces}>The advice could not be read. Try again in a moment.</Frame>
    );
  }
  if (!data) return <Skeleton />;
  if (data.tools.length === 0)
    return <Frame pieces={data.pieces}>This pattern needs neither a die nor a plate.</Frame>;
  return (
    <Frame pieces={data.pieces}>
      <ul className="space-y-5">
        {data.tools.map((found) => (
          <ToolForRunItem key={found.kind} found={found} />
        ))}
      </ul>
      {data.metals && (
        <details className="mt-5" open={open}>
          <summary className="cursor-pointer font-semibold">Which metal for a new plate</summary>
          <MetalAdvice metals={data.metals} runs={data.runs} />
        </details>
      )}
    </Frame>
  );
}

function Frame({ pieces, children }: { pieces: number; children: ReactNode }) {
  return (
    <Card title="Tooling for the run" subtitle={`${countText(pieces)} pieces to cut`}>
      {children}
      <Notice className="mt-5">
        For 20 to 2,000 pieces, fine detail, heat and storage decide more often than wear.
      </Notice>
    </Card>
  );
}
