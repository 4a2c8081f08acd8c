'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { type ApiProblem, api } from '@/lib/http/api-client';

/** One press, one POST without a body; the page is fetched anew when it is done. */
export function useApiAction(path: string, onDone?: () => void) {
  const router = useRouter();
  const { mutate, isPending, error } = useMutation<unknown, ApiProblem, void>({
    mutationFn: () => api(path, { method: 'POST' }),
    onSuccess: () => {
      onDone?.();
      router.refresh();
    },
  });
  return { send: () => mutate(), sending: isPending, problem: error };
}
