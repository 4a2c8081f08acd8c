'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/inputs';
import { formatTime } from '@/lib/reporting/format-time';
import { isOverdue } from '@/lib/schemas/instrument-state';
import { dueWords } from './due-words';
import { fitsKind } from './fits-kind';
import { passWords, type SheetData, type SheetPass, type UsedInstrument } from './sheet-data';
import { useKeptDraft } from './use-kept-draft';
import { useChangePass } from './use-sheet-changes';

const InstrumentPicker = dynamic(() => import('./instrument-picker').then((module) => module.InstrumentPicker), {
  ssr: false,
});

/** Instruments, temperature and time of one set of readings. */
export function PassConditions(props: {
  data: SheetData;
  pass: SheetPass;
  earlier: SheetPass | null;
  readOnly: boolean;
  again: () => Promise<void>;
}) {
  const { data, pass, earlier, readOnly, again } = props;
  const [picking, setPicking] = useState(false);
  const change = useChangePass(data.sheet.id, again);
  const measuredOn = (pass.takenAt ?? data.readAt).slice(0, 10);
  const named = new Map(data.instruments.map((one) => [one.id, one]));
  const save = (instruments: UsedInstrument[]) =>
    change.mutate({ pass, body: { instruments } }, { onSuccess: () => setPicking(false) });
  const proposed = proposal(data, earlier, measuredOn);
  if (data.definition.layout.kind === 'check-list' && data.definition.instruments.length === 0)
    return <TakenBy pass={pass} timeZone={data.timeZone} what="answer" />;
  return (
    <section aria-labelledby="taken-with" className="grid gap-2">
      <h2 id="taken-with" className="font-semibold">
        Taken with
      </h2>
      {pass.instruments.length === 0 ? (
        <p className="text-ink2">No instrument is named yet.</p>
      ) : (
        <ul className="text-[15px] leading-snug text-ink2">
          {pass.instruments.map((used) => {
            const one = named.get(used.instrumentId);
            const late = one ? isOverdue(one.dueOn, measuredOn) : false;
            return (
              <li key={used.instrumentId}>
                {one ? `${one.name} ${one.number}` : 'An instrument no longer in the register'}
                {one?.resolution && ` (${one.resolution} ${one.resolutionUnit})`}
                {one && (
                  <span className={late ? 'font-medium text-brass' : ''}>
                    {', '}
                    {dueWords(one, measuredOn)}
                  </span>
                )}
                {used.overrideReason && `. ${used.overrideReason}, allowed by ${used.overrideBy}`}
              </li>
            );
          })}
        </ul>
      )}
      {!readOnly && (
        <div className="flex flex-wrap gap-x-4">
          <button
            type="button"
            className="min-h-12 font-medium text-blue underline"
            onClick={() => {
              change.reset();
              setPicking(true);
            }}
          >
            {pass.instruments.length === 0 ? 'Choose instruments' : 'Change instruments'}
          </button>
          {pass.instruments.length === 0 && proposed && (
            <button
              type="button"
              className="min-h-12 font-medium text-blue underline"
              disabled={change.isPending}
              onClick={() => save(proposed.used)}
            >
              {proposed.words}
            </button>
          )}
        </div>
      )}
      <Temperature data={data} pass={pass} readOnly={readOnly} again={again} />
      <TakenBy pass={pass} timeZone={data.timeZone} what="reading" />
      {picking && (
        <InstrumentPicker
          instruments={data.instruments}
          wanted={data.definition.instruments}
          used={pass.instruments}
          measuredOn={measuredOn}
          allowedBy={data.viewer.mayAllow ? data.viewer.name : ''}
          saving={change.isPending}
          problem={change.error}
          onSave={save}
          onClose={() => setPicking(false)}
        />
      )}
    </section>
  );
}

function TakenBy({ pass, timeZone, what }: { pass: SheetPass; timeZone: string; what: 'reading' | 'answer' }) {
  return (
    <p className="text-sm text-ink2">
      {pass.takenAt
        ? `First ${what} ${formatTime(new Date(pass.takenAt), timeZone)}${pass.takenBy ? `, ${pass.takenBy}` : ''}`
        : `The first ${what} notes time and name.`}
    </p>
  );
}

/** The instruments of the set before, or of the sheet before: one press, and it says where they come from. */
function proposal(data: SheetData, earlier: SheetPass | null, measuredOn: string) {
  const numbers = (ids: string[]) =>
    ids.map((id) => data.instruments.find((one) => one.id === id)?.number ?? '').filter(Boolean);
  if (earlier && earlier.instruments.length > 0) {
    const ids = earlier.instruments.map((used) => used.instrumentId);
    return { used: earlier.instruments, words: `As ${passWords(earlier)}: ${numbers(ids).join(', ')}` };
  }
  const ids = data.recentInstruments.filter((id) => {
    const one = data.instruments.find((candidate) => candidate.id === id);
    return one && fitsKind(one.kind, data.definition.instruments) && !isOverdue(one.dueOn, measuredOn);
  });
  if (ids.length === 0) return null;
  const used = ids.map((instrumentId) => ({ instrumentId, overrideReason: null, overrideBy: null }));
  return { used, words: `As last in this job: ${numbers(ids).join(', ')}` };
}

function Temperature(props: { data: SheetData; pass: SheetPass; readOnly: boolean; again: () => Promise<void> }) {
  const { data, pass, readOnly, again } = props;
  const change = useChangePass(data.sheet.id, again);
  const { draft, changed, edit, settled } = useKeptDraft(`temperature ${pass.id}`, pass.temperatureText ?? '');
  const save = () => {
    if (!changed || readOnly) return;
    change.mutate({ pass, body: { temperature: draft.trim() } }, { onSuccess: settled });
  };
  return (
    <Field
      label="Temperature at the machine, °C"
      error={change.error?.errors[0]?.detail ?? change.error?.detail}
      className="max-w-72"
    >
      <TextInput
        className="text-right font-mono text-lg"
        value={draft}
        readOnly={readOnly}
        onChange={(event) => edit(event.target.value)}
        onBlur={save}
        onKeyDown={(event) => event.key === 'Enter' && save()}
      />
    </Field>
  );
}
