'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { FileInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { type ApiAnswer, type ApiProblem, api } from '@/lib/http/api-client';
import { type ImportAnswer, ImportPreview } from './import-preview';

const send = (csv: string, preview: boolean): Promise<ApiAnswer<ImportAnswer>> =>
  api<ImportAnswer>('/api/catalogue/values/import', { method: 'POST', body: { csv, preview } });

/** First what a file would change and what is wrong in it; then, pressed once more, it is taken over. */
export function ImportForm() {
  const router = useRouter();
  const [csv, setCsv] = useState<string | null>(null);
  const look = useMutation<ApiAnswer<ImportAnswer>, ApiProblem, string>({ mutationFn: (text) => send(text, true) });
  const take = useMutation<ApiAnswer<ImportAnswer>, ApiProblem, string>({
    mutationFn: (text) => send(text, false),
    onSuccess: () => {
      look.reset();
      setCsv(null);
      router.refresh();
    },
  });
  const choose = async (file: File | undefined) => {
    take.reset();
    look.reset();
    setCsv(null);
    if (!file) return;
    const text = await file.text();
    setCsv(text);
    look.mutate(text);
  };
  const found = look.data?.data;
  const ready = csv !== null && found !== undefined && found.problems.length === 0 && found.changes.length > 0;
  return (
    <div className="grid gap-4">
      <p className="max-w-prose">
        Each changed line becomes what you say of the figure, under your name and today’s date. Lines marked
        “unconfirmed” and lines that say what holds already change nothing. Nothing is changed before you press the
        button below the preview.
      </p>
      <Field label="The file" className="max-w-prose">
        <FileInput accept=".csv,text/csv" onChange={(event) => choose(event.target.files?.[0])} />
      </Field>
      <FormProblem problem={look.error ?? take.error} />
      {found && <ImportPreview found={found} />}
      {ready && (
        <div>
          <Button variant="strong" disabled={take.isPending} onClick={() => take.mutate(csv)}>
            Take over {found.changes.length} {found.changes.length === 1 ? 'change' : 'changes'}
          </Button>
        </div>
      )}
      {take.data && (
        <Notice title="Taken over" live>
          {take.data.data.changes.length} changed, {take.data.data.unchanged} unchanged.
        </Notice>
      )}
    </div>
  );
}
