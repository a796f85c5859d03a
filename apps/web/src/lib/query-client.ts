import { QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './api-problem.ts';

export const sessionKey = ['session'] as const;

function mayPass(failures: number, error: Error): boolean {
  return error instanceof ApiProblem && error.isPassing && error.status !== 429 && failures < 2;
}

export const queryClient: QueryClient = new QueryClient({
  queryCache: new QueryCache({
    onError: (error) => {
      // The session ended elsewhere: reading it again sends the person to the sign-in page.
      if (error instanceof ApiProblem && error.status === 401) {
        void queryClient.invalidateQueries({ queryKey: sessionKey });
      }
    },
  }),
  defaultOptions: {
    queries: {
      retry: mayPass,
      staleTime: 10_000,
      refetchOnWindowFocus: true,
      networkMode: 'always',
    },
    mutations: { retry: false, networkMode: 'always' },
  },
});
