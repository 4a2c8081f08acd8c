'use client';

import { useEffect, useState, useSyncExternalStore } from 'react';
import { SaveState } from '@/components/layout/save-state';
import type { ReadingLog } from './reading-log';
import { saveWords } from './save-words';

const quietMs = 10_000;
const ink = { quiet: 'text-ink2', attention: 'text-brass font-medium', loss: 'text-oxide font-semibold' };

export function useSaveState(log: ReadingLog) {
  return useSyncExternalStore(log.subscribe, log.snapshot, log.snapshot);
}

/** Where the readings are, in the header; the same stands at the foot, where it is read out. */
export function SaveHeadLine({ log }: { log: ReadingLog }) {
  const { words, tone } = saveWords(useSaveState(log));
  return (
    <SaveState>
      <span aria-hidden="true" className={`hidden whitespace-nowrap md:block ${ink[tone]}`}>
        {words}
      </span>
    </SaveState>
  );
}

/** Where the readings are, at the foot and so always in sight; read out at most every ten seconds. */
export function SaveFootLine({ log, className = '' }: { log: ReadingLog; className?: string }) {
  const state = useSaveState(log);
  const { words, tone } = saveWords(state);
  const spoken = useAtMostEvery(words, quietMs);
  const canSend = state.waiting > 0 && state.server !== 'reached';
  return (
    <div className={`flex items-center gap-2 text-sm leading-tight ${className}`}>
      <span aria-hidden="true" className={ink[tone]}>
        {words}
      </span>
      <span role="status" className="sr-only">
        {spoken}
      </span>
      {canSend && (
        <button
          type="button"
          className="min-h-12 px-1 font-medium text-blue underline"
          onClick={() => void log.sendNow()}
        >
          Send now
        </button>
      )}
    </div>
  );
}

function useAtMostEvery(words: string, pauseMs: number): string {
  const [spoken, setSpoken] = useState({ words, at: 0 });
  useEffect(() => {
    if (words === spoken.words) return;
    const wait = Math.max(0, spoken.at + pauseMs - Date.now());
    const timer = setTimeout(() => setSpoken({ words, at: Date.now() }), wait);
    return () => clearTimeout(timer);
  }, [words, spoken, pauseMs]);
  return spoken.words;
}
