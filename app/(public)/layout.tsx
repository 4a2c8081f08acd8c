import type { ReactNode } from 'react';
import { Brand } from '@/components/layout/brand';
import { version } from '@/lib/version';

/** Pages that need no session. */
export default function PublicLayout({ children }: { children: ReactNode }) {
  return (
    <div className="mx-auto flex min-h-dvh max-w-5xl flex-col px-5 py-10">
      <header className="mb-8">
        <Brand />
      </header>
      <main id="main" className="flex-1">
        {children}
      </main>
      <footer className="mt-10 text-sm text-ink2">Witnessmark {version}</footer>
    </div>
  );
}
