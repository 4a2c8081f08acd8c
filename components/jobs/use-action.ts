'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { type ApiAnswer, type ApiProblem, api } from '@/lib/http/api-client';

/** One press, one request; the page is fetched anew when it is done. */
export function useAction<T = unknown>(path: string, options: { onDone?: (answer: T) => void } = {}) {
  const router = useRouter();
  return useMutation<ApiAnswer<T>, ApiProblem, unknown>({
    mutationFn: (body) => api<T>(path, { method: 'POST', body }),
    onSuccess: ({ data }) => {
      options.onDone?.(data);
      router.refresh();
    },
  });
}

/** Takes one thing away; the page is fetched anew when it is done. */
export function useRemoval() {
  const router = useRouter();
  return useMutation<ApiAnswer<unknown>, ApiProblem, string>({
    mutationFn: (path) => api(path, { method: 'DELETE' }),
    onSuccess: () => router.refresh(),
  });
}
