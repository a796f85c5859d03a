import { CSPProvider } from '@base-ui/react/csp-provider';
import { QueryClientProvider } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Toasts } from '../components/toasts.tsx';
import { queryClient } from '../lib/query-client.ts';

export function Providers({ children }: { children: ReactNode }) {
  return (
    <CSPProvider disableStyleElements>
      <QueryClientProvider client={queryClient}>
        {children}
        <Toasts />
      </QueryClientProvider>
    </CSPProvider>
  );
}
