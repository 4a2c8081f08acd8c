'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import type { SheetData } from './sheet-data';

const SheetExplanation = dynamic(() => import('./sheet-explanation').then((module) => module.SheetExplanation), {
  ssr: false,
  loading: () => <p>Working it out</p>,
});

/** The way from what was typed to the verdict, worked out only while somebody looks at it. */
export function HowItCameAbout({ data }: { data: SheetData }) {
  const [open, setOpen] = useState(false);
  return (
    <details className="mt-4 border-y border-line" onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="flex min-h-12 cursor-pointer items-center font-semibold">
        <span aria-hidden="true" className="mr-2">
          ▸
        </span>
        How this figure came about
      </summary>
      {open && <SheetExplanation data={data} />}
    </details>
  );
}
