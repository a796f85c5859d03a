import { readScan } from '@hidewright/contract';
import { useMutation } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ScanField } from '../../../components/scan-field.tsx';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { call } from '../../../lib/api.ts';
import { unknownTag } from '../unknown-tag.ts';
import { StockroomNav } from './stockroom-nav.tsx';

export function Component() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const arrived = search.get('read');
  const scan = useMutation({
    mutationFn: (code: string) => call(readScan, { params: { code } }),
    onSuccess: ({ to }) => void navigate(to),
  });
  const error = scan.error ?? (arrived !== null && scan.isIdle ? unknownTag(arrived) : null);
  return (
    <>
      <PageHeader title="Scan" subtitle="Open a lot, a bin, an order or a ticket by its tag" />
      <StockroomNav />
      <Card className="max-w-2xl">
        <ScanField
          label="Tag"
          help="Aim the hand scanner and press, or type the tag and Enter, such as T-0012."
          error={error === null ? undefined : sentenceOf(error)}
          onScan={(tag) => scan.mutate(tag)}
        />
      </Card>
    </>
  );
}

const sentenceOf = (error: Error) => (error instanceof ApiProblem ? error.detail : error.message);

export const ErrorBoundary = RouteError;
