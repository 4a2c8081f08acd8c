'use client';

import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { ApiProblem, api } from '@/lib/http/api-client';
import { allFields } from '@/lib/sheet/sheet-fields';
import { useEvaluated, useOpenPass } from './sheet-context';

interface Corrected {
  passId: string;
  pointer: string;
  was: string;
  now: string;
  by: string;
  at: string;
  reason: string | null;
}

/** What stood in the fields before: nothing typed is ever gone. Fetched when it is opened. */
export function SheetHistory({ sheetId, timeZone }: { sheetId: string; timeZone: string }) {
  const [open, setOpen] = useState(false);
  const { session, passId } = useOpenPass();
  const fields = useEvaluated(session, passId, (evaluated) => evaluated.fields);
  const history = useQuery({
    queryKey: ['sheet-changes', sheetId],
    enabled: open,
    staleTime: 0,
    queryFn: async () => (await api<{ items: Corrected[] }>(`/api/sheets/${sheetId}/changes`)).data.items,
  });
  const labels = new Map(allFields(fields).map(({ pointer, label }) => [pointer, label]));
  const mine = (history.data ?? []).filter((row) => row.passId === passId);
  const time = new Intl.DateTimeFormat('en-GB', { timeZone, dateStyle: 'medium', timeStyle: 'short' });
  return (
    <details className="mt-4 border-y border-line" onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="flex min-h-12 cursor-pointer items-center font-semibold">
        <span aria-hidden="true" className="mr-2">
          ▸
        </span>
        Readings that were put right
      </summary>
      <div className="pb-3" aria-live="polite">
        {history.isPending && <p className="text-ink2">Being fetched.</p>}
        {history.error && (
          <p className="text-oxide">{history.error instanceof ApiProblem ? history.error.detail : 'Not fetched.'}</p>
        )}
        {history.data && mine.length === 0 && (
          <p className="text-ink2">None in this set, as far as the server knows.</p>
        )}
        {mine.length > 0 && (
          <Table caption="Readings that were put right">
            <TableHead>
              <HeadCell>Field</HeadCell>
              <HeadCell figure>was</HeadCell>
              <HeadCell figure>is</HeadCell>
              <HeadCell>by, when, why</HeadCell>
            </TableHead>
            <tbody>
              {mine.map((row) => (
                <Row key={`${row.pointer} ${row.at} ${row.now}`}>
                  <RowHead>{labels.get(row.pointer) ?? row.pointer}</RowHead>
                  <DataCell figure>{row.was}</DataCell>
                  <DataCell figure>{row.now === '' ? 'empty' : row.now}</DataCell>
                  <DataCell>
                    {row.by}, {time.format(new Date(row.at))}
                    {row.reason && ` · ${row.reason}`}
                  </DataCell>
                </Row>
              ))}
            </tbody>
          </Table>
        )}
      </div>
    </details>
  );
}
