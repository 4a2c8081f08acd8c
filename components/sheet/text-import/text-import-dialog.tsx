'use client';

import { useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Checkbox } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { changeChoices, guessChoices, importText } from '@/lib/sheet/text-import/import-text';
import type { ImportChoices } from '@/lib/sheet/text-import/types';
import type { TestDefinition } from '@/standards/types';
import { useOpenPass } from '../sheet-context';
import { ColumnChoices } from './column-choices';
import { FilledPreview } from './filled-preview';
import { MeaningChoices } from './meaning-choices';
import { ShapeChoices } from './shape-choices';
import { takenWords } from './taken-words';
import { TextSource } from './text-source';

const problemsShown = 12;

/**
 * Readings from a plain text: put in, looked at, explained by the person, shown as the sheet would then be. Nothing of the sheet is
 * changed before “Take over”; then it is one change that can be taken back.
 */
export function TextImportDialog(props: {
  definition: TestDefinition;
  say: (words: string) => void;
  onClose: () => void;
}) {
  const { definition, say, onClose } = props;
  const { session, passId } = useOpenPass();
  const [text, setText] = useState('');
  const [choices, setChoices] = useState<ImportChoices | null>(null);
  const [leavesOut, setLeavesOut] = useState(false);
  const [overwrites, setOverwrites] = useState(false);

  const take = (next: string) => {
    setText(next);
    setChoices(next.trim() === '' ? null : guessChoices(definition.layout, next));
    setLeavesOut(false);
    setOverwrites(false);
  };
  const choose = (change: Partial<ImportChoices>) => {
    if (!choices) return;
    setChoices(changeChoices(text, choices, change));
    setLeavesOut(false);
    setOverwrites(false);
  };
  const made = useMemo(
    () => choices && importText(definition, session.cellsOf(passId), text, choices),
    [definition, session, passId, text, choices],
  );
  const isWhole = made?.problems.every(({ line }) => line !== null) ?? false;
  const isReady =
    made !== null &&
    isWhole &&
    made.fills.length > 0 &&
    (made.problems.length === 0 || leavesOut) &&
    (made.over.length === 0 || overwrites);
  const takeOver = () => {
    if (!made) return;
    session.fill(passId, made.fills, 'paste');
    say(takenWords(made));
    onClose();
  };

  return (
    <Dialog
      open
      wide
      onOpenChange={(stays) => !stays && onClose()}
      title="Readings from a text"
      description="Put in a plain text with columns and say what they hold. The sheet stays as it is until you take the readings over."
    >
      <TextSource text={text} onText={take} />
      {choices && made && (
        <div className="mt-5 grid gap-5">
          <ShapeChoices choices={choices} onChange={choose} />
          <ColumnChoices definition={definition} text={text} choices={choices} onChange={choose} />
          <MeaningChoices definition={definition} text={text} choices={choices} onChange={choose} />
          {made.problems.length > 0 && (
            <Notice tone="oxide" title={isWhole ? 'Lines that cannot be used' : 'Not clear yet'} live>
              <LineList notes={made.problems} />
              {isWhole && (
                <Checkbox
                  label="Leave these lines out and take the rest"
                  checked={leavesOut}
                  onChange={(event) => setLeavesOut(event.target.checked)}
                />
              )}
            </Notice>
          )}
          {made.notes.length > 0 && (
            <Notice tone="brass" title="To look at">
              <LineList notes={made.notes} />
            </Notice>
          )}
          {made.fills.length > 0 && <FilledPreview made={made} />}
          {made.over.length > 0 && (
            <Notice tone="brass" title="Something stands there already" live>
              <p>
                {made.over.length === 1
                  ? 'One field holds another text'
                  : `${made.over.length} fields hold another text`}{' '}
                now. What stands there stays in the history.
              </p>
              <Checkbox
                label="Write over it"
                checked={overwrites}
                onChange={(event) => setOverwrites(event.target.checked)}
              />
            </Notice>
          )}
        </div>
      )}
      <div className="mt-5 flex flex-wrap justify-end gap-3">
        <Button onClick={onClose}>Leave the sheet as it is</Button>
        <Button variant="strong" disabled={!isReady} onClick={takeOver}>
          Take over
        </Button>
      </div>
    </Dialog>
  );
}

function LineList({ notes }: { notes: readonly { line: number | null; message: string }[] }) {
  return (
    <ul className="grid gap-1">
      {notes.slice(0, problemsShown).map(({ line, message }, index) => (
        <li key={index}>
          {line !== null && <span className="font-medium">Line {line}: </span>}
          {message}
        </li>
      ))}
      {notes.length > problemsShown && <li>And {notes.length - problemsShown} more.</li>}
    </ul>
  );
}
