'use client';

import { WentWrong } from '@/components/layout/went-wrong';

export default function PublicError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return <WentWrong error={error} retry={reset} />;
}
