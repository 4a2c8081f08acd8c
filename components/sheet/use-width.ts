'use client';

import { type RefObject, useEffect, useRef, useState } from 'react';

/** Width of a place on the screen, so that a drawing is made for it and its words keep their size. */
export function useWidth(firstPx: number): { box: RefObject<HTMLDivElement | null>; widthPx: number } {
  const box = useRef<HTMLDivElement>(null);
  const [widthPx, setWidthPx] = useState(firstPx);
  useEffect(() => {
    const element = box.current;
    if (!element) return;
    const watch = new ResizeObserver(([entry]) => {
      const width = Math.floor(entry?.contentRect.width ?? 0);
      if (width > 0) setWidthPx(width);
    });
    watch.observe(element);
    return () => watch.disconnect();
  }, []);
  return { box, widthPx };
}
