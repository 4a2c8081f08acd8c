import type { ReactNode } from 'react';

/** A drawing for wide places and the same one drawn anew for a telephone, so that its figures stay legible in both. */
export function ByWidth({ wide, narrow }: { wide: ReactNode; narrow: ReactNode }) {
  return (
    <>
      <div className="hidden sm:block print:block">{wide}</div>
      <div className="sm:hidden print:hidden">{narrow}</div>
    </>
  );
}
