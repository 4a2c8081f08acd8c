'use client';

import { useEffect, useState } from 'react';

/**
 * A text that is saved as a whole (remark, temperature): kept on the device from the first letter until the server has it, so that a
 * reload loses nothing.
 */
export function useKeptDraft(key: string, saved: string) {
  const storageKey = `witnessmark draft ${key}`;
  const [draft, setDraft] = useState(saved);
  const [from, setFrom] = useState(saved);
  if (from !== saved) {
    setFrom(saved);
    if (draft === from) setDraft(saved);
  }
  useEffect(() => {
    const kept = readDraft(storageKey);
    if (kept !== null) setDraft(kept);
  }, [storageKey]);
  return {
    draft,
    changed: draft.trim() !== saved.trim(),
    edit(text: string) {
      setDraft(text);
      writeDraft(storageKey, text);
    },
    settled: () => writeDraft(storageKey, null),
  };
}

function readDraft(key: string): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}

function writeDraft(key: string, text: string | null): void {
  try {
    if (text === null) localStorage.removeItem(key);
    else localStorage.setItem(key, text);
  } catch {
    // Without storage it is as safe as the tab that it is in.
  }
}
