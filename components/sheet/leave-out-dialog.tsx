'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field, FieldErrorLine } from '@/components/ui/field';
import { Radio, TextArea } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { type LeftOutReason, leftOutReasons } from '@/lib/schemas/job';
import type { LiveSheet } from './sheet-data';
import { useChangeSheet } from './use-sheet-changes';

/** Never without a reason: it prints in the report's list of what was not measured. */
export function LeaveOutDialog(props: {
  sheetId: string;
  live: LiveSheet;
  again: () => Promise<void>;
  onClose: () => void;
}) {
  const { sheetId, live, again, onClose } = props;
  const [reason, setReason] = useState<LeftOutReason | null>(null);
  const [text, setText] = useState('');
  const [tried, setTried] = useState(false);
  const change = useChangeSheet(sheetId, again);
  const save = () => {
    setTried(true);
    if (!reason) return;
    change.mutate({ version: live.version, body: { leftOut: { reason, text } } }, { onSuccess: onClose });
  };
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title="Leave this test out"
      description="The report lists it as left out, with this reason. It can be taken in again until the report is issued."
    >
      <fieldset>
        <legend className="font-medium">Reason</legend>
        {Object.entries(leftOutReasons).map(([value, words]) => (
          <Radio
            key={value}
            name="left-out-reason"
            value={value}
            label={words}
            checked={reason === value}
            onChange={() => setReason(value as LeftOutReason)}
          />
        ))}
        {tried && !reason && <FieldErrorLine>Choose a reason.</FieldErrorLine>}
      </fieldset>
      <Field label="In your words" optional className="mt-3">
        <TextArea rows={2} value={text} maxLength={400} onChange={(event) => setText(event.target.value)} />
      </Field>
      {change.error && (
        <Notice tone="oxide" title={change.error.title} live className="mt-3">
          {change.error.detail}
        </Notice>
      )}
      <div className="mt-5 flex flex-wrap justify-end gap-3">
        <Button onClick={onClose}>Keep it in the plan</Button>
        <Button variant="strong" onClick={save} disabled={change.isPending}>
          Leave it out
        </Button>
      </div>
    </Dialog>
  );
}
