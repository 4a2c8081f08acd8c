import type { CellPointer } from '@/lib/sheet/types';

export interface UndoEntry {
  passId: string;
  changes: { pointer: CellPointer; before: string }[];
}

const deepest = 100;

/** Changes of one sheet that can be taken back, also after a reload of the tab. A convenience: readings do not rest on it. */
export class UndoStack {
  private entries: UndoEntry[];
  private readonly key: string;

  constructor(sheetId: string) {
    this.key = `witnessmark undo ${sheetId}`;
    this.entries = this.stored();
  }

  push(entry: UndoEntry): void {
    this.entries = [...this.entries, entry].slice(-deepest);
    this.keep();
  }

  pop(): UndoEntry | null {
    const last = this.entries.pop() ?? null;
    this.keep();
    return last;
  }

  private stored(): UndoEntry[] {
    try {
      return JSON.parse(sessionStorage.getItem(this.key) ?? '[]') as UndoEntry[];
    } catch {
      return [];
    }
  }

  private keep(): void {
    try {
      sessionStorage.setItem(this.key, JSON.stringify(this.entries));
    } catch {
      // A tab that may store nothing can still undo until it is closed.
    }
  }
}
