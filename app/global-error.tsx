'use client';

import { WentWrong } from '@/components/layout/went-wrong';
import './globals.css';

export default function GlobalError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <html lang="en">
      <body className="px-7">
        <WentWrong error={error} retry={reset} />
      </body>
    </html>
  );
}
