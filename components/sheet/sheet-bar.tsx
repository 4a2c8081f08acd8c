'use client';

import Link from 'next/link';
import { type RefObject, useId } from 'react';
import { Button, buttonClass } from '@/components/ui/button';
import { isJudged } from './result-words';
import { SaveFootLine } from './save-line';
import { useEvaluated } from './sheet-context';
import type { PassKind, SheetData, SheetPass } from './sheet-data';
import type { SheetSession } from './sheet-session';

/** Only where there is room beside the other words; a screen reader always hears it. */
const sheetWord = 'max-sm:sr-only xl:max-2xl:sr-only';

/** At the foot, always in reach: keypad, the next set of readings, leaving out, the sheets around, and the one strong action. */
export function SheetBar(props: {
  data: SheetData;
  session: SheetSession;
  passes: SheetPass[];
  readOnly: boolean;
  keypad: boolean;
  busy: boolean;
  checked: boolean;
  checkRef: RefObject<HTMLButtonElement | null>;
  onKeypad: () => void;
  onStart: (pass: { kind: PassKind; linkTo?: string }) => void;
  onLeaveOut: () => void;
  onCheck: () => void;
}) {
  const { data, session, readOnly, keypad, checked, checkRef, onKeypad, onCheck } = props;
  const { job, neighbours } = data;
  const more = useId();
  return (
    <div
      data-print="no"
      data-at-foot
      className="sticky bottom-0 z-20 flex flex-wrap items-center gap-2 border-t border-line bg-paper px-4 py-2.5 sm:px-7"
    >
      {!readOnly && (
        <>
          <Button aria-pressed={keypad} className="px-3 sm:px-3.5" onClick={onKeypad}>
            {keypad ? 'Keypad off' : 'Keypad'}
          </Button>
          <div className="hidden gap-2 xl:flex">
            <PassActions {...props} />
          </div>
          <div className="xl:hidden">
            <button type="button" popoverTarget={more} className={buttonClass('plain', false, 'px-3 sm:px-3.5')}>
              More
            </button>
            <div
              id={more}
              popover="auto"
              className="fixed inset-auto bottom-20 left-5 m-0 rounded border-[1.5px] border-ink bg-paper p-3 text-ink"
            >
              <div className="grid gap-2">
                <PassActions {...props} />
              </div>
            </div>
          </div>
        </>
      )}
      <SaveFootLine log={session.log} className="min-w-0 max-sm:order-last max-sm:w-full sm:ml-1 sm:flex-1" />
      <nav aria-label="Sheets around" className="ml-auto flex gap-2">
        {neighbours.previous && (
          <Link
            href={`/jobs/${job.id}/sheets/${neighbours.previous.id}`}
            title={neighbours.previous.title}
            className={buttonClass('plain', false, 'gap-1.5 px-2.5 sm:px-3.5')}
          >
            ‹ <span className={sheetWord}>Sheet</span> {neighbours.previous.position}
          </Link>
        )}
        {neighbours.next && (
          <Link
            href={`/jobs/${job.id}/sheets/${neighbours.next.id}`}
            title={neighbours.next.title}
            className={buttonClass('plain', false, 'gap-1.5 px-2.5 sm:px-3.5')}
          >
            <span className={sheetWord}>Sheet</span> {neighbours.next.position} ›
          </Link>
        )}
      </nav>
      <Button
        ref={checkRef}
        variant={checked || readOnly ? 'plain' : 'strong'}
        className="max-sm:w-full"
        onClick={onCheck}
      >
        {checked ? 'Check again' : 'Check the sheet'}
      </Button>
    </div>
  );
}

function PassActions(props: Parameters<typeof SheetBar>[0]) {
  const { session, passes, busy, onStart, onLeaveOut } = props;
  const found = passes.find(({ kind }) => kind === 'as-found');
  const newest = passes.at(-1);
  return (
    <>
      {found && newest === found && <LinkAsLeft session={session} found={found} busy={busy} onStart={onStart} />}
      <Button className="px-3.5" disabled={busy} onClick={() => onStart({ kind: 'adjusting' })}>
        Begin adjusting
      </Button>
      <Button className="px-3.5" disabled={busy} onClick={() => onStart({ kind: 'as-left' })}>
        {passes.some(({ kind }) => kind === 'as-left') ? 'Begin as left anew' : 'Begin as left'}
      </Button>
      <Button className="px-3.5" onClick={onLeaveOut}>
        Leave out…
      </Button>
    </>
  );
}

/** Nothing was done and nothing is typed again: offered when the readings as found are complete. */
function LinkAsLeft(props: {
  session: SheetSession;
  found: SheetPass;
  busy: boolean;
  onStart: (pass: { kind: PassKind; linkTo?: string }) => void;
}) {
  const { session, found, busy, onStart } = props;
  const complete = useEvaluated(session, found.id, ({ outcome }) => isJudged(outcome) && outcome.state === 'complete');
  if (!complete) return null;
  return (
    <Button className="px-3.5" disabled={busy} onClick={() => onStart({ kind: 'as-left', linkTo: found.id })}>
      As left = as found
    </Button>
  );
}
