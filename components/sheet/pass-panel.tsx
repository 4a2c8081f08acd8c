'use client';

import type { SheetFields } from '@/lib/sheet/types';
import type { TestDefinition } from '@/standards/types';
import { CheckList } from './check-list';
import { FieldTables, SetUpFields } from './field-tables';
import { LiveFurtherLimits, LivePlot, LiveResult } from './live-result';
import { useEvaluated, useOpenPass } from './sheet-context';
import type { SheetData } from './sheet-data';
import { TextImportButton } from './text-import/text-import-button';
import { useEntry } from './use-entry';

/** Methods whose result carries a sign: their limit rule has zero in the middle, also while it is empty. */
const signedMethods = new Set(['parallelism', 'squareness-to-axis', 'squareness', 'centre-height', 'two-collar']);
const isSigned = ({ method, negativeMeans }: TestDefinition) =>
  signedMethods.has(method) || negativeMeans !== undefined;
/** How many columns of fields leave room for the plot beside the table: on a tablet, on a desk. */
const besideOnTablet = 3;
const besideOnDesk = 5;
const places = {
  tablet: 'grid items-start gap-x-6 sm:grid-cols-[minmax(22.5rem,3fr)_minmax(11rem,2fr)]',
  desk: 'grid items-start gap-x-6 gap-y-4 xl:grid-cols-[minmax(27rem,3fr)_minmax(16rem,2fr)]',
  below: 'grid gap-y-4',
};

/** The fields of one set of readings and what they come to. */
export function PassPanel(props: {
  data: Pick<SheetData, 'definition' | 'rules'>;
  panelId: string;
  tabId: string;
  linked: boolean;
  onEnd: () => void;
  say: (words: string) => void;
}) {
  const { data, panelId, tabId, linked, onEnd, say } = props;
  const { session, passId, readOnly, keypad } = useOpenPass();
  const entry = useEntry({ session, passId, readOnly, onEnd, say });
  const { layout } = data.definition;
  const place = useEvaluated(session, passId, ({ fields }) => placeOfPlot(fields));
  return (
    <div role="tabpanel" id={panelId} aria-labelledby={tabId}>
      {linked && <p className="py-2 text-ink2">As left is declared to be as found, reading for reading:</p>}
      {!linked && <TextImportButton definition={data.definition} say={say} />}
      {layout.kind === 'check-list' ? (
        <CheckList items={layout.items} say={say} />
      ) : (
        <div {...entry}>
          <SetUpFields />
          <div className={places[place]}>
            <div className="min-w-0 pt-2">
              <FieldTables />
            </div>
            <div className={place === 'below' ? '' : 'pt-6'}>
              <LivePlot heightPx={place === 'below' ? 230 : 290} />
            </div>
          </div>
        </div>
      )}
      <div data-at-foot className={`bg-paper py-2 sm:bottom-[4.4rem] sm:z-10 ${keypad ? 'lg:sticky' : 'sm:sticky'}`}>
        <LiveResult
          rules={data.rules}
          signed={isSigned(data.definition)}
          shownIn={data.definition.shownIn ?? 'mm'}
          items={layout.kind === 'check-list' ? layout.items.length : undefined}
        />
      </div>
      <LiveFurtherLimits />
    </div>
  );
}

function placeOfPlot({ tables: [table, ...more] }: SheetFields): keyof typeof places {
  if (!table || more.length > 0) return 'below';
  const columns = Math.max(...table.rows.map(({ cells }) => cells.filter((cell) => cell && 'field' in cell).length));
  if (columns <= besideOnTablet) return 'tablet';
  return columns <= besideOnDesk ? 'desk' : 'below';
}
