'use client';

import { useState } from 'react';
import { PassPanel } from '@/components/sheet/pass-panel';
import { OpenPassContext } from '@/components/sheet/sheet-context';
import type { SheetData } from '@/components/sheet/sheet-data';
import { SheetSession } from '@/components/sheet/sheet-session';
import { toleranceWords } from '@/components/sheet/tolerance-words';
import { SetUpSketch } from '@/components/sketches/set-up-sketch';
import { examplePass } from './example-data';
import { TryOutLog } from './try-out-log';

const nobody = new Set<string>();

/** The sheet as the inspector will find it: figures can be tried, nothing is kept. */
export function TryOutSheet({ data }: { data: SheetData }) {
  const { sheet, definition, rules, place, machine } = data;
  const [session] = useState(() => {
    const where = { sheetId: sheet.id, jobId: data.job.id, sheetTitle: sheet.title };
    return new SheetSession(where, rules, definition, data.passes, new TryOutLog());
  });
  const [said, setSaid] = useState('');
  return (
    <OpenPassContext
      value={{
        ...{ session, passId: examplePass, title: sheet.title, readOnly: false, keypad: false, checked: false },
        ...{ confirmed: nobody, confirm: () => setSaid('On a real sheet it is noted that somebody looked at it.') },
      }}
    >
      <h3 className="text-xl font-semibold leading-tight">{sheet.title}</h3>
      <p className="text-sm text-ink2">
        {place} · shown on {machine.model}
      </p>
      <div className="mt-3 max-w-96">
        <SetUpSketch spec={definition.sketch} component={sheet.component} />
      </div>
      <p className="mt-2 font-semibold">{toleranceWords(rules.tolerance, rules.direction, definition.shownIn)}</p>
      <p id="try-out-tab" className="sr-only">
        Readings that are tried out
      </p>
      <PassPanel
        data={data}
        panelId="try-out"
        tabId="try-out-tab"
        linked={false}
        onEnd={() => setSaid('That was the last reading.')}
        say={setSaid}
      />
      <p role="status" className="text-sm text-ink2">
        {said}
      </p>
    </OpenPassContext>
  );
}
