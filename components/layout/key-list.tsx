'use client';

import { Dialog } from '@/components/ui/dialog';

const keys: { keys: string[]; does: string }[] = [
  { keys: ['/'], does: 'go to the search' },
  { keys: ['?'], does: 'show this list' },
  { keys: ['Enter'], does: 'on a sheet: next reading in the order taken' },
  { keys: ['Shift', 'Enter'], does: 'on a sheet: the reading before' },
  { keys: ['↑', '↓'], does: 'on a sheet: up and down the column' },
  { keys: ['Esc'], does: 'on a sheet: what stood in the field before; elsewhere: close' },
  { keys: ['Tab'], does: 'next field or button' },
];

export function KeyList({ onClose }: { onClose: () => void }) {
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title="Keys">
      <dl className="grid grid-cols-[auto_1fr] items-baseline gap-x-6 gap-y-3">
        {keys.map((entry) => (
          <div key={entry.does} className="contents">
            <dt className="flex gap-1.5">
              {entry.keys.map((key) => (
                <kbd key={key} className="rounded border-[1.5px] border-ink bg-leaf px-2 py-0.5 font-mono text-sm">
                  {key}
                </kbd>
              ))}
            </dt>
            <dd>{entry.does}</dd>
          </div>
        ))}
      </dl>
    </Dialog>
  );
}
