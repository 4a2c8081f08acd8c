'use client';

import { createContext, type ReactNode, useContext, useEffect, useMemo, useRef, useState } from 'react';

interface Seen {
  seen: boolean;
  note: () => void;
}

const SeenContext = createContext<Seen>({ seen: false, note: () => undefined });

/** Remembers whether a reader has had the deviations, or the end of the document, in front of them. */
export function SeenBefore({ children }: { children: ReactNode }) {
  const [seen, setSeen] = useState(false);
  const value = useMemo(() => ({ seen, note: () => setSeen(true) }), [seen]);
  return <SeenContext value={value}>{children}</SeenContext>;
}

export const useSeen = (): boolean => useContext(SeenContext).seen;

/** Stands where what must be seen ends. */
export function SeenMark() {
  const mark = useRef<HTMLDivElement>(null);
  const { note } = useContext(SeenContext);
  useEffect(() => {
    const element = mark.current;
    if (!element) return;
    const observer = new IntersectionObserver((entries) => {
      if (entries.some((entry) => entry.isIntersecting)) note();
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, [note]);
  return <div ref={mark} aria-hidden="true" className="h-px" />;
}
