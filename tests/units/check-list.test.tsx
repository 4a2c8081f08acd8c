import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { CheckList } from '@/components/sheet/check-list';
import { ReadingLog } from '@/components/sheet/reading-log';
import { OpenPassContext } from '@/components/sheet/sheet-context';
import { sheetFindings } from '@/components/sheet/sheet-findings';
import { SheetSession } from '@/components/sheet/sheet-session';
import { ApiProblem } from '@/lib/http/api-client';
import { readingOperation } from '@/lib/schemas/operation';
import { functionCheck } from '../helpers/every-layout';

const definition = functionCheck();
const items = definition.layout.kind === 'check-list' ? definition.layout.items : [];
const passId = '01a230df-d079-72c0-ad15-1ecefe8eca0b';

function open(entries: Record<string, string>) {
  const log = new ReadingLog({
    store: { load: async () => [], write: async () => {} },
    clockTime: () => '10:00',
    // No network: what is answered stays on the device.
    send: async () => {
      throw new ApiProblem({ status: 0, title: 'No network', detail: '', errors: [] } as never);
    },
  } as never);
  const cells = Object.fromEntries(
    Object.entries(entries).map(([pointer, text]) => [`/items/${pointer}`, { text, unit: null, version: 1 }]),
  );
  const rules = { definition, tolerance: null, direction: 'either' as const, decisionRule: 'simple' as const };
  return new SheetSession(
    { sheetId: 's', jobId: 'j', sheetTitle: definition.title },
    rules,
    definition,
    [{ id: passId, cells }],
    log,
  );
}

const markup = (session: SheetSession, more: { readOnly?: boolean; checked?: boolean } = {}) =>
  renderToStaticMarkup(
    <OpenPassContext
      value={{
        session,
        passId,
        title: definition.title,
        readOnly: more.readOnly ?? false,
        keypad: false,
        checked: more.checked ?? false,
        confirmed: new Set(),
        confirm: () => {},
      }}
    >
      <CheckList items={items} say={() => {}} />
    </OpenPassContext>,
  );

describe('entry of a function check', () => {
  it('has a named group of three answers a row, each 48 px high', () => {
    const html = markup(open({}));
    expect(html.match(/<fieldset/g)).toHaveLength(items.length);
    expect(html.match(/type="radio"/g)).toHaveLength(items.length * 3);
    for (const { id } of items) {
      const named = html.match(new RegExp(`<fieldset[^>]*aria-labelledby="([^"]*-${id})"`))?.[1];
      expect(html).toContain(`<p id="${named}"`);
    }
    expect(html.match(/<label[^>]*min-h-12/g)).toHaveLength(items.length * 3);
    expect(html).not.toContain('checked=""');
  });

  it('shows what is answered, and the figure with its unit and limits', () => {
    const html = markup(open({ 'stop/answer': 'no', 'air/answer': 'yes', 'air/value': '5.2', 'lamp/remark': 'dim' }));
    expect(html.match(/<input[^>]*checked=""[^>]*>/g)?.map((input) => input.match(/value="([^"]*)"/)?.[1])).toEqual([
      'no',
      'yes',
    ]);
    expect(html).toContain('pressure, bar (4 to 6)');
    expect(html).toContain(
      'aria-label="The compressed air has its pressure behind the filter. – pressure, bar, 4 to 6"',
    );
    expect(html).toMatch(/value="5\.2"/);
    expect(html).toMatch(/value="dim"/);
  });

  it('can be read but not changed where nothing may be measured', () => {
    const html = markup(open({}), { readOnly: true });
    expect(html.match(/<input[^>]*type="radio"[^>]*disabled=""|<input[^>]*disabled=""[^>]*type="radio"/g)).toHaveLength(
      items.length * 3,
    );
  });

  it('says at an item that it is not answered once the sheet is checked, and asks no figure of what is not fitted', () => {
    const session = open({ 'stop/answer': 'yes', 'air/answer': 'not-fitted' });
    const html = markup(session, { checked: true });
    expect(html.match(/Not answered yet\./g)).toHaveLength(3);
    expect(html).not.toContain('Not read yet');
    expect(markup(open({ 'air/answer': 'yes', 'air/value': 'much' }))).toMatch(/aria-invalid="true"/);
  });

  it('keeps an answer as a change that can be taken back', () => {
    const session = open({ 'stop/answer': 'yes' });
    session.fill(passId, [{ pointer: '/items/stop/answer', text: 'no' }], 'typed');
    expect(session.textOf(passId, '/items/stop/answer')).toBe('no');
    expect(session.undoLast()).toEqual({ passId, pointer: '/items/stop/answer' });
    expect(session.textOf(passId, '/items/stop/answer')).toBe('yes');
  });

  it('takes a remark of a few sentences, and no reading as long as that', () => {
    const operation = (cellId: string, text: string) => ({
      ...{ opId: passId, passId, cellId, baseVersion: 0, text, unit: null, source: 'typed', seq: 1 },
      deviceTime: '2026-03-10T08:00:00Z',
    });
    const remark = 'The tube is broken, a new one is ordered and comes next week. '.repeat(4);
    expect(readingOperation.safeParse(operation('/items/lamp/remark', remark)).success).toBe(true);
    expect(readingOperation.safeParse(operation('/items/lamp/answer', remark)).success).toBe(false);
    expect(readingOperation.safeParse(operation('/readings/0', remark)).success).toBe(false);
    expect(readingOperation.safeParse(operation('/items/lamp/remark', remark.repeat(2))).success).toBe(false);
  });

  it('needs neither an instrument nor a temperature, only every item', () => {
    const find = (entries: Record<string, string>) => {
      const session = open(entries);
      const pass = { id: passId, kind: 'as-left' as const, number: 1, linkedTo: null, takenAt: null, takenBy: null };
      const whole = { ...pass, temperatureText: null, version: 1, cells: {}, instruments: [], result: null };
      return sheetFindings({
        evaluated: session.evaluation(passId),
        pass: whole,
        passes: [whole],
        instruments: [],
        confirmed: new Set(),
        remark: null,
        textOf: (pointer) => session.textOf(passId, pointer),
        today: '2026-03-10T08:00:00Z',
        check: true,
      });
    };
    const all = { 'stop/answer': 'yes', 'door/answer': 'yes', 'air/answer': 'no', 'bush/answer': 'yes' };
    expect(find({ ...all, 'lamp/answer': 'yes' })).toEqual([]);
    expect(find(all)).toMatchObject([{ weight: 'missing', label: 'The working light comes on.' }]);
    expect(find({})).toMatchObject([{ message: 'Not answered yet.' }]);
  });
});
