export interface CellChangeText {
  passId: string;
  pointer: string;
  text: string;
  by: string;
  at: Date;
  reason: string | null;
}

export interface CorrectedReading {
  pointer: string;
  was: string;
  now: string;
  by: string;
  at: Date;
  reason: string | null;
}

/** Readings of one set that stood differently before: both texts, oldest first. A field that was empty before is no correction. */
export function correctedReadings(changes: CellChangeText[], passId: string): CorrectedReading[] {
  const last = new Map<string, string>();
  const found: CorrectedReading[] = [];
  for (const { pointer, text, by, at, reason } of changes.filter((change) => change.passId === passId)) {
    const was = last.get(pointer);
    if (was !== undefined && was !== '' && was !== text) found.push({ pointer, was, now: text, by, at, reason });
    last.set(pointer, text);
  }
  return found;
}
