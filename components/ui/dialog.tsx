'use client';

import { Dialog as Primitive } from 'radix-ui';
import type { ReactNode } from 'react';
import { Button } from './button';

/** Asks or shows one thing above the page. Escape and "Close" leave it; the focus goes back to where it was. */
export function Dialog(props: {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  description?: string;
  /** For tables: as wide as a tablet held upright allows, and wider on a desk. */
  wide?: boolean;
  children: ReactNode;
}) {
  const { open, onOpenChange, title, description, wide, children } = props;
  return (
    <Primitive.Root open={open} onOpenChange={onOpenChange}>
      <Primitive.Portal>
        <Primitive.Overlay className="fixed inset-0 z-40 bg-[rgb(16_22_28/0.55)]" />
        <Primitive.Content
          className={`fixed left-1/2 top-[8vh] z-50 max-h-[84vh] -translate-x-1/2 overflow-y-auto rounded border-[1.5px] border-ink bg-paper p-6 ${
            wide ? 'w-[min(68rem,calc(100vw-2rem))]' : 'w-[min(36rem,calc(100vw-2rem))]'
          }`}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <div className="mb-4 flex items-start justify-between gap-4">
            <Primitive.Title className="text-xl font-semibold">{title}</Primitive.Title>
            <Primitive.Close asChild>
              <Button variant="quiet" small>
                Close
              </Button>
            </Primitive.Close>
          </div>
          {description && <Primitive.Description className="mb-4 text-ink2">{description}</Primitive.Description>}
          {children}
        </Primitive.Content>
      </Primitive.Portal>
    </Primitive.Root>
  );
}
