'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { type ApiAnswer, type ApiProblem, api } from '@/lib/http/api-client';
import type { LeftOutReason } from '@/lib/schemas/job';
import type { PassAnswer } from './reading-log';
import {
  type LiveSheet,
  liveSheet,
  type PassKind,
  type SheetAnswer,
  type SheetData,
  type UsedInstrument,
} from './sheet-data';

/** Everything of a sheet that is not a reading, and the ways to change it; readings go through the log. */
export function useLiveSheet(data: SheetData) {
  const { sheet } = data;
  const key = ['sheet', sheet.id];
  const client = useQueryClient();
  const { data: live } = useQuery({
    queryKey: key,
    queryFn: async () => liveSheet((await api<SheetAnswer>(`/api/sheets/${sheet.id}`)).data),
    initialData: { passes: data.passes, remark: sheet.remark, leftOut: sheet.leftOut, version: sheet.version },
    initialDataUpdatedAt: Date.parse(data.readAt),
    refetchOnWindowFocus: true,
  });
  const put = useCallback(
    (change: (before: LiveSheet) => LiveSheet) =>
      client.setQueryData<LiveSheet>(['sheet', sheet.id], (before) => (before ? change(before) : before)),
    [client, sheet.id],
  );
  /** A set of readings gets a new version and a time with every reading that the server takes. */
  const takePasses = useCallback(
    (answers: PassAnswer[]) =>
      put((before) => ({
        ...before,
        passes: before.passes.map((pass) => {
          const answer = answers.find(({ id }) => id === pass.id);
          return answer ? { ...pass, version: answer.version, takenAt: answer.takenAt } : pass;
        }),
      })),
    [put],
  );
  const again = () => client.invalidateQueries({ queryKey: key });
  return { live: live as LiveSheet, takePasses, again };
}

export function useStartPass(sheetId: string, again: () => Promise<void>) {
  return useMutation<ApiAnswer<{ id: string }>, ApiProblem, { kind: PassKind; linkTo?: string }>({
    mutationFn: (pass) => api<{ id: string }>(`/api/sheets/${sheetId}/passes`, { method: 'POST', body: pass }),
    onSuccess: again,
  });
}

interface PassChange {
  pass: { id: string; version: number };
  body: { temperature?: string; instruments?: UsedInstrument[] };
}

export function useChangePass(sheetId: string, again: () => Promise<void>) {
  return useMutation<ApiAnswer<unknown>, ApiProblem, PassChange>({
    mutationFn: (change) =>
      api(`/api/sheets/${sheetId}/passes/${change.pass.id}`, {
        method: 'PATCH',
        version: change.pass.version,
        body: change.body,
      }),
    // Also after a refusal: somebody else may have been quicker.
    onSettled: again,
  });
}

interface SheetChange {
  version: number;
  body: { remark?: string; leftOut?: { reason: LeftOutReason; text: string } | null };
}

export function useChangeSheet(sheetId: string, again: () => Promise<void>) {
  return useMutation<ApiAnswer<unknown>, ApiProblem, SheetChange>({
    mutationFn: (change) =>
      api(`/api/sheets/${sheetId}`, { method: 'PATCH', version: change.version, body: change.body }),
    onSettled: again,
  });
}
