import type { LogCounts } from './operation-log';

export interface SaveState extends LogCounts {
  /** Changes that are not yet (or cannot be) written on the device. */
  unwritten: number;
  storage: 'ready' | 'full' | 'unavailable';
  /** What the last request came to. */
  server: 'reached' | 'unreachable' | 'signed-out' | 'refusing';
  /** `14:05`: when the server last answered. */
  serverTime: string | null;
}

/** The one line that says where the readings are. */
export function saveWords(state: SaveState): { words: string; tone: 'quiet' | 'attention' | 'loss' } {
  const { waiting, conflicts, rejected, unwritten, storage, server, serverTime } = state;
  const decisions = conflicts + rejected;
  const at =
    server === 'signed-out' ? 'sign in to send' : serverTime ? `server ${serverTime}` : 'server not reached yet';
  if (unwritten > 0 && storage !== 'ready') {
    return {
      words: storage === 'full' ? 'Not saved – storage full' : 'Not saved – this browser keeps nothing',
      tone: 'loss',
    };
  }
  const needs = decisions === 1 ? '1 needs a decision' : `${decisions} need a decision`;
  if (decisions > 0) return { words: waiting > 0 ? `${needs} · ${waiting} waiting` : needs, tone: 'attention' };
  if (unwritten > 0) return { words: `Being written on this device · ${at}`, tone: 'quiet' };
  if (waiting > 0) {
    return { words: `On this device: ${waiting} waiting · ${at}`, tone: server === 'reached' ? 'quiet' : 'attention' };
  }
  return { words: serverTime ? `All on server ${serverTime}` : 'Nothing waiting', tone: 'quiet' };
}
