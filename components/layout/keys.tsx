'use client';

import dynamic from 'next/dynamic';
import { useEffect, useState } from 'react';

const KeyList = dynamic(() => import('./key-list').then((module) => module.KeyList), { ssr: false });

const isTyping = (target: EventTarget | null) =>
  target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName));

/** `/` goes to the search, `?` lists the keys; neither while something is being typed. */
export function Keys() {
  const [open, setOpen] = useState(false);
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      if (event.key === '/') {
        event.preventDefault();
        document.getElementById('search')?.focus();
      }
      if (event.key === '?') {
        event.preventDefault();
        setOpen(true);
      }
    };
    document.addEventListener('keydown', listen);
    return () => document.removeEventListener('keydown', listen);
  }, []);
  return (
    <>
      <button type="button" className="min-h-6 underline" onClick={() => setOpen(true)}>
        Keys
      </button>
      {open && <KeyList onClose={() => setOpen(false)} />}
    </>
  );
}
