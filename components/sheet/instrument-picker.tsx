'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { Checkbox, TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import type { ApiProblem } from '@/lib/http/api-client';
import { isOverdue } from '@/lib/schemas/instrument-state';
import { dueWords } from './due-words';
import { fitsKind } from './fits-kind';
import type { Instrument, UsedInstrument } from './sheet-data';

type Choice = Map<string, { reason: string; by: string }>;

/** Instruments of a set of readings, out of the register. One after its due date wants a reason and a name, and both print. */
export function InstrumentPicker(props: {
  instruments: Instrument[];
  /** Kinds that this test asks for: they come first. */
  wanted: string[];
  used: UsedInstrument[];
  measuredOn: string;
  allowedBy: string;
  saving: boolean;
  problem: ApiProblem | null;
  onSave: (used: UsedInstrument[]) => void;
  onClose: () => void;
}) {
  const { instruments, wanted, used, measuredOn, allowedBy, saving, problem, onSave, onClose } = props;
  const [choice, setChoice] = useState<Choice>(
    () =>
      new Map(used.map((one) => [one.instrumentId, { reason: one.overrideReason ?? '', by: one.overrideBy ?? '' }])),
  );
  const [tried, setTried] = useState(false);
  const change = (id: string, entry: { reason: string; by: string } | null) => {
    const next = new Map(choice);
    if (entry) next.set(id, entry);
    else next.delete(id);
    setChoice(next);
  };
  const overdue = (one: Instrument) => isOverdue(one.dueOn, measuredOn);
  const open = instruments.filter((one) => {
    const entry = choice.get(one.id);
    return entry && overdue(one) && !(entry.reason.trim() && entry.by.trim());
  });
  const save = () => {
    setTried(true);
    if (open.length > 0) return;
    onSave(
      [...choice].map(([instrumentId, { reason, by }]) => ({
        instrumentId,
        overrideReason: reason.trim() || null,
        overrideBy: by.trim() || null,
      })),
    );
  };
  const sorted = [...instruments].sort((a, b) => Number(fitsKind(b.kind, wanted)) - Number(fitsKind(a.kind, wanted)));
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title="Instruments of this set of readings"
      description={`This test asks for: ${wanted.join(', ')}.`}
    >
      {instruments.length === 0 && (
        <p className="mb-4">The register is empty. Add the instrument under Instruments first.</p>
      )}
      <ul className="divide-y divide-hair border-y border-line">
        {sorted.map((one) => {
          const entry = choice.get(one.id);
          return (
            <li key={one.id} className="py-1">
              <Checkbox
                label={`${one.number} · ${one.name}`}
                hint={`${one.kind}${one.resolution ? `, ${one.resolution} ${one.resolutionUnit}` : ''} · ${dueWords(one, measuredOn)}`}
                checked={entry !== undefined}
                onChange={(event) =>
                  change(one.id, event.target.checked ? { reason: '', by: overdue(one) ? allowedBy : '' } : null)
                }
              />
              {entry && overdue(one) && (
                <div className="mb-2 ml-9 grid gap-2 border-l-4 border-brass pl-3 sm:grid-cols-[2fr_1fr]">
                  <Field
                    label="Why it may be used all the same"
                    error={tried && !entry.reason.trim() ? 'Give the reason; it prints on the report.' : undefined}
                  >
                    <TextInput
                      value={entry.reason}
                      onChange={(event) => change(one.id, { ...entry, reason: event.target.value })}
                    />
                  </Field>
                  <Field label="Allowed by" error={tried && !entry.by.trim() ? 'Say who allows it.' : undefined}>
                    <TextInput
                      value={entry.by}
                      onChange={(event) => change(one.id, { ...entry, by: event.target.value })}
                    />
                  </Field>
                </div>
              )}
            </li>
          );
        })}
      </ul>
      {problem && (
        <Notice tone="oxide" title={problem.title} live className="mt-4">
          {problem.detail}
        </Notice>
      )}
      <div className="mt-5 flex flex-wrap justify-end gap-3">
        <Button onClick={onClose}>Leave as it was</Button>
        <Button variant="strong" onClick={save} disabled={saving}>
          Take these instruments
        </Button>
      </div>
    </Dialog>
  );
}
