'use client';

import { useState } from 'react';
import { Field } from '@/components/ui/field';
import { FileInput, TextArea } from '@/components/ui/inputs';
import { longestText } from '@/lib/sheet/text-table';

/** A pasted text or a file; the file is read here in the browser and sent nowhere. */
export function TextSource({ text, onText }: { text: string; onText: (text: string) => void }) {
  const [problem, setProblem] = useState<string | undefined>();
  const take = (next: string) => {
    const isTooLong = next.length > longestText;
    setProblem(isTooLong ? 'The text is longer than 2 MB.' : undefined);
    if (!isTooLong) onText(next);
  };
  const readFile = async (file: File | undefined) => {
    if (!file) return;
    if (file.size > longestText) {
      setProblem(`${file.name} is larger than 2 MB.`);
      return;
    }
    const next = await file.text().catch(() => null);
    if (next === null) setProblem(`${file.name} could not be read.`);
    else if (next.includes('\0')) setProblem(`${file.name} is no plain text.`);
    else take(next);
  };
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      <Field label="Text" hint="Paste it here." error={problem}>
        <TextArea
          rows={5}
          className="font-mono text-sm"
          spellCheck={false}
          value={text}
          onChange={(event) => take(event.target.value)}
        />
      </Field>
      <Field label="Or a file" hint="Plain text, .txt or .csv, at most 2 MB.">
        <FileInput
          accept=".txt,.csv,text/plain,text/csv"
          onChange={(event) => void readFile(event.target.files?.[0])}
        />
      </Field>
    </div>
  );
}
