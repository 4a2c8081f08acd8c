import type { ReactNode } from 'react';

/**
 * A drawing or table for the desk and for paper, the same drawn anew for a tablet (where it differs) and for a telephone, so that
 * figures stay legible in each. Only one of them is there for the eye, the keyboard and a screen reader.
 */
export function ByWidth({ wide, medium, narrow }: { wide: ReactNode; medium?: ReactNode; narrow: ReactNode }) {
  return (
    <>
      <div className={`hidden print:block ${medium ? 'lg:block' : 'sm:block'}`}>{wide}</div>
      {medium && <div className="hidden sm:block lg:hidden print:hidden">{medium}</div>}
      <div className="sm:hidden print:hidden">{narrow}</div>
    </>
  );
}
