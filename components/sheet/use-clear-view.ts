'use client';

import { useEffect } from 'react';

/** For the container of everything that can have the focus above the foot. */
export const clearOfFoot =
  '[&_input]:scroll-mb-[var(--foot)] [&_select]:scroll-mb-[var(--foot)] [&_textarea]:scroll-mb-[var(--foot)] [&_button]:scroll-mb-[var(--foot)] [&_a]:scroll-mb-[var(--foot)]';

/**
 * The field with the focus must not lie behind what sticks to the foot of the screen: how high that is stands in `--foot`, whatever is
 * opened or closed there, and what can have the focus keeps that distance (`clearOfFoot`). The page's own scroll padding would also
 * hold for the buttons at the foot, and make the page jump when one of them is pressed.
 */
export function useClearView(): void {
  useEffect(() => {
    const root = document.documentElement;
    const watch = new ResizeObserver(() => measure());
    const measure = () => {
      const parts = [...document.querySelectorAll<HTMLElement>('[data-at-foot]')];
      const heights = parts.map((part) => {
        watch.observe(part);
        return getComputedStyle(part).position === 'sticky' ? part.offsetHeight : 0;
      });
      const foot = heights.reduce((sum, height) => sum + height, 0) + 12;
      root.style.setProperty('--foot', `${foot}px`);
      keepInView(foot);
    };
    watch.observe(document.body);
    const changes = new MutationObserver(measure);
    changes.observe(document.body, { childList: true, subtree: true });
    measure();
    root.style.scrollPaddingBottom = '0px';
    return () => {
      watch.disconnect();
      changes.disconnect();
      root.style.scrollPaddingBottom = '';
      root.style.removeProperty('--foot');
    };
  }, []);
}

/** The last reading makes the result appear, and with it the foot grows over the field that was just typed into. */
function keepInView(footPx: number): void {
  const field = document.activeElement;
  if (!(field instanceof HTMLInputElement || field instanceof HTMLTextAreaElement) || field.closest('[data-at-foot]'))
    return;
  if (field.getBoundingClientRect().bottom > window.innerHeight - footPx) field.scrollIntoView({ block: 'nearest' });
}
