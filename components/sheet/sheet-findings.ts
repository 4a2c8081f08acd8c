import { isOverdue } from '@/lib/schemas/instrument-state';
import { allFields } from '@/lib/sheet/sheet-fields';
import type { CellPointer } from '@/lib/sheet/types';
import { notAnsweredYet, notReadYet, problemAt } from './field-problem';
import { type Instrument, passWords, type SheetPass } from './sheet-data';
import type { Evaluated } from './sheet-session';

export interface SheetFinding {
  /** missing: cannot go out so; look: confirm or say something about it. */
  weight: 'missing' | 'look';
  /** Field that the finding leads to; null: it concerns the set of readings as a whole. */
  pointer: CellPointer | null;
  /** What it concerns; the message is the same text that stands at the field. */
  label: string;
  message: string;
}

/** What "Check the sheet" finds in the set of readings on screen, in the order of the fields. Pure. */
export function sheetFindings(input: {
  evaluated: Evaluated;
  pass: SheetPass;
  passes: SheetPass[];
  instruments: Instrument[];
  confirmed: ReadonlySet<CellPointer>;
  remark: string | null;
  textOf: (pointer: CellPointer) => string;
  today: string;
  /** A function check: it needs no instrument and no temperature. */
  check?: boolean;
}): SheetFinding[] {
  const { evaluated, confirmed, textOf } = input;
  const atFields = allFields(evaluated.fields).flatMap((field): SheetFinding[] => {
    const { pointer, label } = field;
    const problem = problemAt(evaluated, pointer, { checked: true, confirmed, text: textOf(pointer) });
    if (!problem) return [];
    // A remark on the sheet is the other way to answer for an unusual figure.
    if (problem[0] === '?' && input.remark) return [];
    return [{ weight: problem[0] === '?' ? 'look' : 'missing', pointer, label, message: problem.slice(1) }];
  });
  return [...gathered(atFields, evaluated.outcome.filled), ...aroundPass(input)];
}

/** A sheet on which nothing was read yet says so once, not at every field. */
function gathered(findings: SheetFinding[], filled: number): SheetFinding[] {
  if (filled > 0) return findings;
  const bare = ({ message }: SheetFinding) => message === notReadYet || message === notAnsweredYet;
  const first = findings.find(bare);
  const others = findings.filter((finding) => !bare(finding));
  return first ? [{ ...first, label: `${first.label} and all after it` }, ...others] : others;
}

function aroundPass(input: Parameters<typeof sheetFindings>[0]): SheetFinding[] {
  const { pass, passes, instruments, today } = input;
  const found: SheetFinding[] = [];
  const add = (weight: SheetFinding['weight'], label: string, message: string) =>
    found.push({ weight, pointer: null, label, message });
  const measuredOn = (pass.takenAt ?? today).slice(0, 10);
  if (pass.linkedTo === null && !input.check) {
    if (pass.instruments.length === 0) add('missing', 'Instruments', 'No instrument is named.');
    for (const used of pass.instruments) {
      const one = instruments.find(({ id }) => id === used.instrumentId);
      if (one && isOverdue(one.dueOn, measuredOn) && !used.overrideReason) {
        add('missing', one.number, 'After its due date: say why it may be used, and who allows it.');
      }
    }
    if (!pass.temperatureText) add('look', 'Temperature', 'Not noted for this set of readings.');
  }
  if (!passes.some(({ kind }) => kind === 'as-left')) {
    add(
      'look',
      passWords({ kind: 'as-left', number: 1 }),
      input.check
        ? 'Not checked as left: check again, or declare as left = as found.'
        : 'No readings as left: measure again, or declare as left = as found.',
    );
  }
  return found;
}
