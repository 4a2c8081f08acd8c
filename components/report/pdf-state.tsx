'use client';

import { useQuery } from '@tanstack/react-query';
import { buttonClass } from '@/components/ui/button';
import { api } from '@/lib/http/api-client';

export interface PdfFacts {
  pdfState: 'waiting' | 'ready' | 'failed';
  pdfFileId: string | null;
  signedPdfFileId: string | null;
  pdfErrorId: string | null;
}

const firstSeconds = 2;
const mostSeconds = 20;

/** The PDF as issued and with the answer, as soon as they are drawn; in words while they are not. */
export function PdfState({ reportId, answered, first }: { reportId: string; answered: boolean; first: PdfFacts }) {
  const { data, isError } = useQuery({
    queryKey: ['report-pdf', reportId, answered],
    queryFn: async ({ signal }): Promise<PdfFacts> => {
      const report = (await api<PdfFacts>(`/api/reports/${reportId}`, { signal })).data;
      const { pdfState, pdfFileId, signedPdfFileId, pdfErrorId } = report;
      return { pdfState, pdfFileId, signedPdfFileId, pdfErrorId };
    },
    initialData: first,
    // Asked less and less often: a document is drawn in seconds, or something is wrong.
    refetchInterval: ({ state }) =>
      state.data?.pdfState === 'ready'
        ? false
        : Math.min(firstSeconds * 2 ** Math.floor(state.dataUpdateCount / 4), mostSeconds) * 1000,
  });
  const path = `/api/reports/${reportId}/pdf`;
  return (
    <div className="grid gap-2">
      {data.signedPdfFileId && (
        <a href={`${path}?as=signed`} download className={buttonClass()}>
          Download the PDF with the answer
        </a>
      )}
      {data.pdfFileId && (
        <a href={`${path}?as=issued`} download className={buttonClass()}>
          {data.signedPdfFileId || answered ? 'Download the PDF as issued' : 'Download the PDF'}
        </a>
      )}
      <p role="status" className="text-sm empty:hidden">
        {words(data, answered)}
        {isError && ' The server did not answer just now; this is tried again.'}
      </p>
    </div>
  );
}

function words({ pdfState, pdfFileId, pdfErrorId }: PdfFacts, answered: boolean): string {
  if (pdfState === 'ready') return '';
  const which = answered && pdfFileId ? 'The PDF with the answer' : 'The PDF';
  if (pdfState === 'waiting') return `${which} is being drawn. It appears here by itself.`;
  return `${which} could not be drawn. It is tried again; if it stays so, tell your administrator this id: ${pdfErrorId ?? 'not recorded'}`;
}
