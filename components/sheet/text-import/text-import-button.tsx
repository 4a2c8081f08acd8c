'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { mappingOf } from '@/lib/sheet/text-import/import-text';
import type { TestDefinition } from '@/standards/types';
import { useOpenPass } from '../sheet-context';

const TextImportDialog = dynamic(() => import('./text-import-dialog').then((module) => module.TextImportDialog), {
  ssr: false,
});

/** Opens the import of readings from a text, on sheets that take one. */
export function TextImportButton({ definition, say }: { definition: TestDefinition; say: (words: string) => void }) {
  const { readOnly } = useOpenPass();
  const [isOpen, setOpen] = useState(false);
  if (readOnly || !mappingOf(definition.layout)) return null;
  return (
    <div className="pb-2">
      <Button small onClick={() => setOpen(true)}>
        Readings from a text
      </Button>
      {isOpen && <TextImportDialog definition={definition} say={say} onClose={() => setOpen(false)} />}
    </div>
  );
}
