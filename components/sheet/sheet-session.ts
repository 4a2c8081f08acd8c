import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { CellPointer, CellProblem, Cells, Field, SheetFields, SheetOutcome, SheetRules } from '@/lib/sheet/types';
import { parseNumber } from '@/lib/units/parse-number';
import type { Unit } from '@/lib/units/unit';
import type { TestDefinition } from '@/standards/types';
import { cellKey, type KnownCell, textOver } from './operation-log';
import type { Change, PassAnswer, ReadingLog, SheetPlace } from './reading-log';
import { UndoStack } from './undo-stack';

export interface PassCells {
  id: string;
  cells: Record<CellPointer, KnownCell>;
}

/** What a set of readings comes to at this moment. The same object until something of it changes. */
export interface Evaluated {
  fields: SheetFields;
  /** The same text as long as the tables have the same fields in the same places. */
  shape: string;
  outcome: SheetOutcome;
  problems: ReadonlyMap<CellPointer, CellProblem>;
}

/**
 * One open sheet outside of React: what stands in every field, what it comes to, and what has been committed. Fields are uncontrolled
 * inputs; only what is derived from them is drawn again.
 */
export class SheetSession {
  private readonly current = new Map<string, { text: string; unit: Unit | null }>();
  private readonly known = new Map<string, KnownCell>();
  private readonly inputs = new Map<string, HTMLInputElement | HTMLSelectElement>();
  private readonly evaluated = new Map<string, Evaluated>();
  private readonly listeners = new Set<() => void>();
  private readonly passes = new Map<string, Set<CellPointer>>();
  private readonly undo: UndoStack;
  private stale = false;

  constructor(
    private readonly sheet: SheetPlace,
    private readonly rules: SheetRules,
    private readonly definition: TestDefinition,
    passes: readonly PassCells[],
    readonly log: ReadingLog,
  ) {
    this.undo = new UndoStack(sheet.sheetId);
    this.takeServer(passes);
  }

  subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Ties session and log together while the sheet is open. */
  connect(onPasses: (passes: PassAnswer[]) => void): () => void {
    const silence = this.log.listen((updates, passes) => {
      for (const { sheetId, passId, cellId, cell } of updates) {
        if (sheetId === this.sheet.sheetId) this.learn(passId, cellId, cell);
      }
      onPasses(passes.filter(({ id }) => this.passes.has(id)));
    });
    const leave = this.log.subscribe(() => this.layLogOver());
    return () => {
      silence();
      leave();
    };
  }

  /** The server's cells, with what waits on the device laid over them. What is being typed stays. */
  takeServer(passes: readonly PassCells[]): void {
    for (const pass of passes) {
      if (!this.passes.has(pass.id)) this.passes.set(pass.id, new Set());
      for (const [pointer, cell] of Object.entries(pass.cells)) this.learn(pass.id, pointer, cell);
    }
    this.layLogOver();
  }

  textOf(passId: string, pointer: CellPointer): string {
    return this.current.get(cellKey(passId, pointer))?.text ?? '';
  }

  /** The text with the unit that applies to it. */
  cellAt(passId: string, pointer: CellPointer): { text: string; unit: Unit | null } {
    return this.current.get(cellKey(passId, pointer)) ?? { text: '', unit: null };
  }

  committedText(passId: string, pointer: CellPointer): string {
    return this.settled(passId, pointer).text;
  }

  register(passId: string, pointer: CellPointer, input: HTMLInputElement | HTMLSelectElement | null): void {
    const key = cellKey(passId, pointer);
    if (input) this.inputs.set(key, input);
    else this.inputs.delete(key);
  }

  inputOf = (passId: string, pointer: CellPointer) => this.inputs.get(cellKey(passId, pointer)) ?? null;

  /** Every keystroke: nothing is stored yet, everything derived is worked out before the next picture. */
  type(passId: string, pointer: CellPointer, text: string): void {
    this.put(passId, pointer, text, this.unitFor(passId, pointer, text));
    this.refreshSoon();
  }

  /** What stands in the fields becomes a change in the log, where it differs from what is settled. */
  commit(passId: string, pointers: readonly CellPointer[], source: Change['source']): void {
    const changed = pointers.filter((pointer) => this.textOf(passId, pointer) !== this.committedText(passId, pointer));
    if (changed.length === 0) return;
    this.undo.push({
      passId,
      changes: changed.map((pointer) => ({ pointer, before: this.committedText(passId, pointer) })),
    });
    this.write(passId, changed, source);
  }

  /** Fills fields at once: a pasted column, a whole text; one undo. `unit`: where the field may not be there yet. */
  fill(
    passId: string,
    fills: readonly { pointer: CellPointer; text: string; unit?: Unit | null }[],
    source: Change['source'],
  ): void {
    for (const { pointer, text, unit } of fills) this.show(passId, pointer, text, unit);
    this.commit(
      passId,
      fills.map(({ pointer }) => pointer),
      source,
    );
    this.refreshSoon();
  }

  /** Takes the newest change back, by another change. @returns the field it was in */
  undoLast(): { passId: string; pointer: CellPointer } | null {
    const entry = this.undo.pop();
    const first = entry?.changes[0];
    if (!entry || !first) return null;
    for (const { pointer, before } of entry.changes) this.show(entry.passId, pointer, before);
    this.write(
      entry.passId,
      entry.changes.map(({ pointer }) => pointer),
      'typed',
    );
    this.refreshSoon();
    return { passId: entry.passId, pointer: first.pointer };
  }

  /** Back to what is settled (Escape). */
  restore(passId: string, pointer: CellPointer): void {
    this.show(passId, pointer, this.committedText(passId, pointer));
    this.refreshSoon();
  }

  /** An unusual figure was looked at and stands: recorded as a change to the same text, with its reason. */
  confirm(passId: string, pointer: CellPointer, reason: string): void {
    const settled = this.settled(passId, pointer);
    const change: Change = { passId, cellId: pointer, text: settled.text, unit: settled.unit, source: 'typed', reason };
    void this.log.commit(this.sheet, [{ change, known: this.known.get(cellKey(passId, pointer)) }]);
  }

  evaluation(passId: string): Evaluated {
    const ready = this.evaluated.get(passId);
    if (ready) return ready;
    const made = this.evaluate(passId);
    this.evaluated.set(passId, made);
    return made;
  }

  /** Everything that stands in the fields of a set of readings. */
  cellsOf(passId: string): Cells {
    const cells: Cells = {};
    for (const pointer of this.passes.get(passId) ?? []) {
      const cell = this.current.get(cellKey(passId, pointer));
      if (cell && cell.text !== '') cells[pointer] = cell;
    }
    return cells;
  }

  private evaluate(passId: string): Evaluated {
    const cells = this.cellsOf(passId);
    const fields = sheetFields(this.definition, cells);
    const outcome = judgeSheet(this.rules, this.definition, cells);
    const problems = new Map(outcome.problems.map((problem) => [problem.pointer, problem]));
    return { fields, shape: shapeOf(fields), outcome, problems };
  }

  private refreshSoon(): void {
    // On the server the first picture is the only one.
    if (typeof document === 'undefined') {
      this.evaluated.clear();
      return;
    }
    if (this.stale) return;
    this.stale = true;
    const refresh = () => {
      this.stale = false;
      this.evaluated.clear();
      for (const listener of this.listeners) listener();
    };
    if (document.hidden) setTimeout(refresh, 16);
    else requestAnimationFrame(refresh);
  }

  private write(passId: string, pointers: readonly CellPointer[], source: Change['source']): void {
    void this.log.commit(
      this.sheet,
      pointers.map((pointer) => {
        const { text, unit } = this.cellAt(passId, pointer);
        const change: Change = { passId, cellId: pointer, text, unit, source };
        return { change, known: this.known.get(cellKey(passId, pointer)) };
      }),
    );
  }

  private settled(passId: string, pointer: CellPointer): KnownCell {
    return textOver(this.log.log, this.known.get(cellKey(passId, pointer)), passId, pointer);
  }

  private learn(passId: string, pointer: CellPointer, cell: KnownCell): void {
    const key = cellKey(passId, pointer);
    if ((this.known.get(key)?.version ?? -1) >= cell.version) return;
    const untouched = this.textOf(passId, pointer) === this.committedText(passId, pointer);
    this.known.set(key, cell);
    this.passes.get(passId)?.add(pointer);
    if (untouched) this.follow(passId, pointer);
  }

  /** Fields follow the log: loaded after a reload, changed by another tab, decided after a conflict. */
  private layLogOver(): void {
    for (const { operation, sheetId } of this.log.log) {
      if (sheetId !== this.sheet.sheetId || !this.passes.has(operation.passId)) continue;
      const typing = this.inputOf(operation.passId, operation.cellId);
      if (!typing || typing !== document.activeElement) this.follow(operation.passId, operation.cellId);
    }
    this.refreshSoon();
  }

  private follow(passId: string, pointer: CellPointer): void {
    const { text, unit } = this.settled(passId, pointer);
    if (this.textOf(passId, pointer) === text) this.put(passId, pointer, text, unit);
    else this.show(passId, pointer, text, unit);
  }

  private show(passId: string, pointer: CellPointer, text: string, unit?: Unit | null): void {
    this.put(passId, pointer, text, unit === undefined ? this.unitFor(passId, pointer, text) : unit);
    const input = this.inputOf(passId, pointer);
    if (input && input.value !== text) input.value = text;
  }

  private put(passId: string, pointer: CellPointer, text: string, unit: Unit | null): void {
    this.passes.get(passId)?.add(pointer);
    this.current.set(cellKey(passId, pointer), { text, unit });
  }

  /** A unit typed behind the figure; otherwise the column's. */
  private unitFor(passId: string, pointer: CellPointer, text: string): Unit | null {
    const field = this.fieldOf(passId, pointer);
    if (!field?.unit) return null;
    const parsed = parseNumber(text);
    return (parsed.ok && parsed.unit) || field.unit;
  }

  private fieldOf(passId: string, pointer: CellPointer): Field | undefined {
    return allFields(this.evaluation(passId).fields).find((field) => field.pointer === pointer);
  }
}

function shapeOf(fields: SheetFields): string {
  return JSON.stringify(fields, (key, value) => (key === 'derived' ? '' : value));
}
