'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { ApiProblem } from '@/lib/http/api-client';

/** What the reader can mend is shown at once; only a missing answer or a fault of the server is tried again. */
const worthAnotherTry = (failures: number, error: Error) =>
  failures < 2 && (!(error instanceof ApiProblem) || error.status === 0 || error.status >= 500);

export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(
    () => new QueryClient({ defaultOptions: { queries: { retry: worthAnotherTry, staleTime: 10_000 } } }),
  );
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
