'use client';

import { useEffect } from 'react';

/**
 * The field with the focus must not lie behind what sticks to the foot of the screen: the browser is told how high that is, whatever
 * is opened or closed there.
 */
export function useClearView(): void {
  useEffect(() => {
    const root = document.documentElement;
    const measure = () => {
      const heights = [...document.querySelectorAll<HTMLElement>('[data-at-foot]')].map((part) =>
        getComputedStyle(part).position === 'sticky' ? part.offsetHeight : 0,
      );
      root.style.scrollPaddingBottom = `${heights.reduce((sum, height) => sum + height, 0) + 12}px`;
    };
    const watch = new ResizeObserver(measure);
    watch.observe(document.body);
    const changes = new MutationObserver(measure);
    changes.observe(document.body, { childList: true, subtree: true });
    measure();
    return () => {
      watch.disconnect();
      changes.disconnect();
      root.style.scrollPaddingBottom = '';
    };
  }, []);
}
