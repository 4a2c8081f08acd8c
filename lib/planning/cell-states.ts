import type { DecimalText, TestDefinition } from '@/standards/types';
import { type ToleranceCell, toleranceCellKey, toleranceCells } from './organisation-values';

/** One thing that was said of a figure, as it is stored. */
export interface SaidOfCell {
  id: string;
  definition: Pick<TestDefinition, 'id' | 'code' | 'edition' | 'version'>;
  cell: string;
  state: 'confirmed' | 'replaced' | 'withdrawn';
  figure: DecimalText | null;
  unit: ToleranceCell['unit'];
  ofEdition: string;
  clause: string;
  remark: string | null;
  accountId: string;
  accountName: string;
  recordedAt: Date;
  needsSecond: boolean;
  secondAccountId: string | null;
  secondAccountName: string | null;
  secondAt: Date | null;
}

/** A figure of a tolerance with what the organisation says of it now. */
export interface CellState<S extends SaidOfCell = SaidOfCell> extends ToleranceCell {
  /** waiting: said by one person, and a second one is wanted. It may stand beside a value that holds. */
  state: 'unconfirmed' | 'waiting' | 'confirmed' | 'replaced';
  /** What holds; null: the catalogue's figure, unconfirmed. */
  holding: S | null;
  waiting: S | null;
  /** The figure that a plan uses now, in `unit`. */
  figure: DecimalText;
}

/**
 * Every figure of a definition with its state. Pure.
 * @param holding newest row of each figure that holds; @param newest newest row of each figure at all
 */
export function cellStates<S extends SaidOfCell>(
  definition: TestDefinition,
  holding: readonly S[],
  newest: readonly S[],
): CellState<S>[] {
  const held = byKey(holding);
  const said = byKey(newest);
  return toleranceCells(definition).map((cell) => {
    const key = toleranceCellKey(definition, cell.cell);
    const last = said.get(key);
    const waiting = last?.needsSecond && last.secondAccountId === null ? last : null;
    const found = held.get(key);
    const now = found && found.state !== 'withdrawn' ? found : null;
    const state = now ? (now.state as 'confirmed' | 'replaced') : waiting ? 'waiting' : 'unconfirmed';
    return { ...cell, state, holding: now, waiting, figure: now?.figure ?? cell.toleranceUm };
  });
}

const byKey = <S extends SaidOfCell>(rows: readonly S[]) =>
  new Map(rows.map((row) => [toleranceCellKey(row.definition, row.cell), row]));

/** `2 of 3 confirmed`; a figure that was replaced is confirmed too. */
export function confirmedCount(cells: readonly CellState[]): { confirmed: number; waiting: number; total: number } {
  return {
    confirmed: cells.filter(({ holding }) => holding).length,
    waiting: cells.filter(({ waiting }) => waiting).length,
    total: cells.length,
  };
}
