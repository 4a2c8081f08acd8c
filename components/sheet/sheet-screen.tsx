'use client';

import dynamic from 'next/dynamic';
import { useCallback, useEffect, useRef, useState } from 'react';
import { flushSync } from 'react-dom';
import { Notice } from '@/components/ui/notice';
import { allFields } from '@/lib/sheet/sheet-fields';
import type { CellPointer } from '@/lib/sheet/types';
import { HowItCameAbout } from './how-it-came-about';
import { PassConditions } from './pass-conditions';
import { PassPanel } from './pass-panel';
import { PassTabs } from './pass-tabs';
import { Remark } from './remark';
import { SaveHeadLine, useSaveState } from './save-line';
import { SheetBar } from './sheet-bar';
import { SheetCheck } from './sheet-check';
import { OpenPassContext } from './sheet-context';
import { passWords, type SheetData } from './sheet-data';
import { SheetBackground, SheetHead } from './sheet-guide';
import { SheetHistory } from './sheet-history';
import { SheetNotices } from './sheet-notices';
import { SheetPhotos } from './sheet-photos';
import { SheetSession } from './sheet-session';
import { StrayReadings } from './stray-readings';
import { Undecided } from './undecided';
import { clearOfFoot, useClearView } from './use-clear-view';
import { clockTime, useReadingLog } from './use-reading-log';
import { useLiveSheet, useStartPass } from './use-sheet-changes';

const LeaveOutDialog = dynamic(() => import('./leave-out-dialog').then((module) => module.LeaveOutDialog), {
  ssr: false,
});
const Keypad = dynamic(() => import('./keypad').then((module) => module.Keypad), { ssr: false });

const panelId = 'readings';

/** The entry screen: everything that it needs comes with `data`; from then on it runs without the server. */
export function SheetScreen({ data }: { data: SheetData }) {
  const log = useReadingLog({ accountId: data.viewer.accountId, timeZone: data.timeZone, readAt: data.readAt });
  const { live, takePasses, again } = useLiveSheet(data);
  const { passes } = live;
  const { sheet } = data;
  const [session] = useState(
    () =>
      new SheetSession(
        { sheetId: sheet.id, jobId: data.job.id, sheetTitle: sheet.title },
        data.rules,
        data.definition,
        data.passes,
        log,
      ),
  );
  useEffect(() => session.connect(takePasses), [session, takePasses]);
  useEffect(() => session.takeServer(passes), [session, passes]);

  const [chosen, setChosen] = useState<string | null>(null);
  const pass = passes.find(({ id }) => id === chosen) ?? passes.at(-1);
  const [keypad, setKeypad] = useState(false);
  const [checked, setChecked] = useState(false);
  const [leavingOut, setLeavingOut] = useState(false);
  const [said, setSaid] = useState('');
  const [confirmed, setConfirmed] = useState<ReadonlySet<CellPointer>>(new Set());
  const checkButton = useRef<HTMLButtonElement>(null);
  const checkHeading = useRef<HTMLHeadingElement>(null);
  const start = useStartPass(sheet.id, again);
  const { server } = useSaveState(log);
  useClearView();

  // A linked set shows the readings that it stands for.
  const passId = pass?.linkedTo ?? pass?.id ?? '';
  const readOnly = !data.viewer.mayMeasure || data.job.closed !== null || live.leftOut !== null;
  const confirm = useCallback(
    (pointer: CellPointer) => {
      session.confirm(passId, pointer, 'looked at: it was read so');
      setConfirmed((before) => new Set(before).add(pointer));
    },
    [session, passId],
  );
  const onEnd = useCallback(() => checkButton.current?.focus({ preventScroll: true }), []);
  const choose = (id: string) => {
    setChosen(id);
    setChecked(false);
    setConfirmed(new Set());
  };
  const firstEmpty = () => {
    const { fields } = session.evaluation(passId);
    const pointer =
      fields.order.find((candidate) => session.textOf(passId, candidate).trim() === '') ?? fields.order[0];
    const input = pointer ? session.inputOf(passId, pointer) : null;
    return input instanceof HTMLInputElement ? input : null;
  };
  const check = () => {
    flushSync(() => setChecked(true));
    checkHeading.current?.focus();
  };
  const labelOf = (id: string, pointer: CellPointer) => {
    const of = passes.find((candidate) => candidate.id === id);
    const field = allFields(session.evaluation(id).fields).find((candidate) => candidate.pointer === pointer);
    return `${field?.label ?? pointer}${of && id !== passId ? `, ${passWords(of)}` : ''}`;
  };

  if (!pass) return <Notice tone="oxide" title="This sheet has no set of readings" />;
  const at = passes.indexOf(pass);
  const linked = pass.linkedTo !== null;
  return (
    <OpenPassContext
      value={{ session, passId, title: sheet.title, readOnly: readOnly || linked, keypad, checked, confirmed, confirm }}
    >
      <SaveHeadLine log={log} />
      <div className="-mx-7 -mb-10 -mt-5 flex flex-col">
        <div
          className={`grid flex-1 lg:grid-cols-[minmax(18rem,23.5rem)_minmax(0,1fr)] lg:grid-rows-[auto_1fr] ${clearOfFoot}`}
        >
          <section className="flex flex-col gap-4 px-5 py-4 sm:px-7 lg:px-5" aria-label="The test">
            <SheetHead data={data} />
          </section>
          <section
            className="min-w-0 border-line px-5 py-3 max-lg:border-y sm:px-7 lg:col-start-2 lg:row-span-2 lg:row-start-1 lg:border-l lg:px-5"
            aria-label="Readings"
          >
            <SheetNotices
              data={data}
              live={live}
              server={server}
              again={again}
              failed={start.error}
              said={said}
              onHeard={() => setSaid('')}
            />
            <Undecided log={log} sheetId={sheet.id} labelOf={labelOf} clock={clockTime(data.timeZone)} />
            {!readOnly && !linked && (
              <StrayReadings
                onPlace={(text) => {
                  const input = firstEmpty();
                  if (!input?.dataset.pointer) return false;
                  session.fill(passId, [{ pointer: input.dataset.pointer, text }], 'device');
                  input.focus();
                  return true;
                }}
              />
            )}
            {checked && (
              <SheetCheck
                data={data}
                passes={passes}
                pass={pass}
                remark={live.remark}
                headingRef={checkHeading}
                onClose={() => setChecked(false)}
              />
            )}
            <PassTabs session={session} passes={passes} chosen={pass.id} onChoose={choose} panelId={panelId} />
            <PassPanel
              key={pass.id}
              data={data}
              panelId={panelId}
              tabId={`${panelId}-${pass.id}`}
              linked={linked}
              onEnd={onEnd}
              say={setSaid}
            />
            <div className="mt-5 max-w-2xl">
              <HowItCameAbout data={data} />
              <SheetHistory key={`history ${live.version}`} sheetId={sheet.id} timeZone={data.timeZone} />
              <SheetPhotos sheetId={sheet.id} layout={data.definition.layout} readOnly={readOnly} />
              <Remark sheetId={sheet.id} live={live} readOnly={readOnly} again={again} />
            </div>
          </section>
          <section className="flex flex-col gap-4 px-5 py-4 sm:px-7 lg:px-5 lg:pt-0" aria-label="How it is taken">
            <div className="grid gap-4 sm:max-lg:grid-cols-2">
              <PassConditions
                key={pass.id}
                data={data}
                pass={linked ? (passes.find(({ id }) => id === pass.linkedTo) ?? pass) : pass}
                earlier={passes.slice(0, at).findLast(({ instruments }) => instruments.length > 0) ?? null}
                readOnly={readOnly || linked}
                again={again}
              />
              <SheetBackground data={data} />
            </div>
            {keypad && (
              <div className="fixed bottom-[4.4rem] left-0 z-10 hidden w-[23.5rem] border-t border-r border-line bg-paper px-5 py-3 lg:block">
                <Keypad onNothing={firstEmpty} />
              </div>
            )}
          </section>
        </div>
        {keypad && (
          <div
            data-at-foot
            className="sticky bottom-[4.4rem] z-20 border-t border-line bg-paper px-5 py-2 sm:px-7 lg:hidden"
          >
            <Keypad onNothing={firstEmpty} />
          </div>
        )}
        <SheetBar
          data={data}
          session={session}
          passes={passes}
          readOnly={readOnly}
          keypad={keypad}
          busy={start.isPending}
          checked={checked}
          checkRef={checkButton}
          onKeypad={() => setKeypad(!keypad)}
          onStart={(next) => start.mutate(next, { onSuccess: ({ data: { id } }) => choose(id) })}
          onLeaveOut={() => setLeavingOut(true)}
          onCheck={check}
        />
      </div>
      {leavingOut && (
        <LeaveOutDialog sheetId={sheet.id} live={live} again={again} onClose={() => setLeavingOut(false)} />
      )}
    </OpenPassContext>
  );
}
