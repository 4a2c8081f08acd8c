'use client';

import { Field } from '@/components/ui/field';
import { TextArea } from '@/components/ui/inputs';
import type { LiveSheet } from './sheet-data';
import { useKeptDraft } from './use-kept-draft';
import { useChangeSheet } from './use-sheet-changes';

/** What the reader of the report should know beside the figures. Saved when the field is left; a draft survives a reload. */
export function Remark(props: { sheetId: string; live: LiveSheet; readOnly: boolean; again: () => Promise<void> }) {
  const { sheetId, live, readOnly, again } = props;
  const change = useChangeSheet(sheetId, again);
  const { draft, changed, edit, settled } = useKeptDraft(`remark ${sheetId}`, live.remark ?? '');
  const save = () => {
    if (!changed || readOnly) return;
    change.mutate({ version: live.version, body: { remark: draft.trim() } }, { onSuccess: settled });
  };
  const state = change.isPending ? 'Being sent' : changed ? 'Kept on this device' : draft ? 'On server' : '';
  return (
    <Field label="Remark, prints on the report" optional hint={state} error={change.error?.detail}>
      <TextArea
        rows={2}
        value={draft}
        readOnly={readOnly}
        maxLength={2000}
        onChange={(event) => edit(event.target.value)}
        onBlur={save}
      />
    </Field>
  );
}
