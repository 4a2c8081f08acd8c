'use client';

import { FieldTables } from './field-tables';
import { LivePlot, LiveResult } from './live-result';
import { useEvaluated, useOpenPass } from './sheet-context';
import type { SheetData } from './sheet-data';
import { useEntry } from './use-entry';

/** Methods whose result carries a sign: their limit rule has zero in the middle, also while it is empty. */
const signedMethods = new Set(['parallelism', 'squareness-to-axis', 'squareness', 'centre-height', 'two-collar']);
/** More columns than this leave no room for a plot beside the table. */
const narrowTable = 4;

/** The fields of one set of readings and what they come to. */
export function PassPanel(props: {
  data: SheetData;
  panelId: string;
  tabId: string;
  linked: boolean;
  onEnd: () => void;
  say: (words: string) => void;
}) {
  const { data, panelId, tabId, linked, onEnd, say } = props;
  const { session, passId, readOnly } = useOpenPass();
  const entry = useEntry({ session, passId, readOnly, onEnd, say });
  const beside = useEvaluated(
    session,
    passId,
    ({ fields }) => fields.tables.length === 1 && (fields.tables[0]?.columns.length ?? 0) <= narrowTable,
  );
  return (
    <div role="tabpanel" id={panelId} aria-labelledby={tabId}>
      {linked && <p className="py-2 text-ink2">As left is declared to be as found, reading for reading:</p>}
      <div className={beside ? 'grid items-start gap-x-6 sm:grid-cols-[minmax(0,3fr)_minmax(11rem,2fr)]' : ''}>
        <div {...entry} className="scroll-pb-24 pt-2">
          <FieldTables />
        </div>
        <div className={beside ? 'pt-10' : 'pt-4'}>
          <LivePlot widthPx={beside ? 320 : 560} heightPx={beside ? 300 : 240} />
        </div>
      </div>
      <div className="mt-4">
        <LiveResult rules={data.rules} signed={signedMethods.has(data.definition.method)} />
      </div>
    </div>
  );
}
