'use client';

import { Button } from '@/components/ui/button';

export function FormActions({
  onExample,
  onClear,
  said,
}: {
  onExample: () => void;
  onClear: () => void;
  said: string;
}) {
  return (
    <div className="mb-4 flex flex-wrap items-center gap-2">
      <Button onClick={onExample}>Fill in the example</Button>
      <Button onClick={onClear}>Clear</Button>
      <p role="status" className="text-sm text-ink2">
        {said}
      </p>
    </div>
  );
}
