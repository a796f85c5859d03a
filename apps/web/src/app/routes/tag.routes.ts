import { readScan } from '@hidewright/contract';
import { redirect, type LoaderFunctionArgs, type RouteObject } from 'react-router-dom';
import { PageLoading } from '../../components/loading.tsx';
import { RouteError } from '../../components/route-error.tsx';
import { ApiProblem } from '../../lib/api-problem.ts';
import { call } from '../../lib/api.ts';

/** The address that a printed tag carries leads on to the thing itself. */
async function leadOn({ params }: LoaderFunctionArgs) {
  const code = params['tag'] ?? '';
  try {
    const { to } = await call(readScan, { params: { code } });
    return redirect(to);
  } catch (error) {
    if (!(error instanceof ApiProblem) || error.status !== 404) throw error;
    return redirect(`/stockroom/scan?read=${encodeURIComponent(code)}`);
  }
}

export const tagRoutes: RouteObject[] = [
  { path: '/t/:tag', loader: leadOn, Component: PageLoading, ErrorBoundary: RouteError },
];
