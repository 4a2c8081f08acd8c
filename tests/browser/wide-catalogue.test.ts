import type { Browser, Locator, Page } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { expectAccessible, launchBrowser, visitor, widths } from '@/tests/helpers/browser';
import {
  allOnServer,
  chooseInstrument,
  openJobBoard,
  readingFields,
  reportPdf,
  typeReadings,
} from '@/tests/helpers/line';
import { flat, pdfText } from '@/tests/helpers/pdf-text';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser?.close());

const model = { manufacturer: 'Harrow & Pell', year: '2024' };

async function sent(page: Page, path: string, data: object) {
  const answer = await page.request.post(path, { data });
  expect(answer.ok(), `${path}: ${await answer.text()}`).toBe(true);
  return answer.json();
}

/** A machine as one of the starting make-ups, and a job on it that waits for its plan. */
async function jobOn(page: Page, start: string, name: string, more: object = {}): Promise<string> {
  const { makeUp } = startingMakeUps.find(({ title }) => title === start)!;
  const [customer] = (await (await page.request.get('/api/customers')).json()).items;
  const nameplate = { ...model, model: `M ${start.length}`, serialNumber: `${name}-S`, customerId: customer.id };
  const machine = await sent(page, '/api/machines', { ...nameplate, makeUp });
  const job = { machineId: machine.id, customerId: customer.id, reference: name, purpose: 'overhaul' };
  return (await sent(page, '/api/jobs', { ...job, startsOn: '2026-11-16', people: [], ...more })).id;
}

const planMade = (page: Page) => page.waitForURL(/\/jobs\/[0-9a-f-]{36}$/);

it('a plan of hundreds of tests: searched, proposed by what was opened, kept as a template', async () => {
  const { page, faults, context } = await visitor(browser, 'inspector@quillmere.example', widths.tablet);
  const wide = 'Turning centre with two turrets, gang slide and three channels';
  await page.goto(`/jobs/${await jobOn(page, wide, 'QMF-4001')}/plan`);
  await page.getByRole('button', { name: 'Make the plan' }).waitFor();
  const steps = page.getByRole('navigation', { name: 'Steps of the plan' }).getByRole('link');
  const allSteps = await steps.count();
  expect(allSteps).toBeGreaterThan(10);
  const all = Number(/\d+/.exec((await page.getByRole('status').first().textContent())!)![0]);
  expect(all).toBeGreaterThan(200);

  await page.getByLabel('Show only tests with').fill('positioning B1');
  await page.getByText(new RegExp(`^\\d+ of ${all} tests are shown`)).waitFor();
  await page.getByRole('checkbox', { name: /^Positioning of B1/ }).waitFor();
  expect(await page.getByRole('checkbox', { name: /^Positioning of X1/ }).count()).toBe(0);
  await page.getByLabel('Show only tests with').fill('');
  await expect.poll(() => steps.count()).toBe(allSteps);

  await page.getByRole('button', { name: 'Say what was opened' }).click();
  const dialog = page.getByRole('dialog', { name: 'What was opened' });
  await dialog.getByLabel('axis B1: what was done').selectOption({ label: 'removed and refitted' });
  await dialog.getByRole('button', { name: 'Everything else was untouched' }).click();
  await dialog.getByRole('button', { name: 'Keep what was opened' }).click();
  const take = page.getByRole('button', { name: /^Take these; the other \d+ were not touched/ });
  await take.waitFor();
  const rest = Number(/other (\d+)/.exec((await take.textContent())!)![1]);
  const b1 = page.getByRole('listitem').filter({ hasText: 'Positioning of B1' }).last();
  await b1.getByText('Follows: axis B1 was removed and refitted.').waitFor();
  await expectAccessible(page, 'plan of a machine with three channels');
  await take.click();
  await page.getByText(new RegExp(`^${all - rest} of ${all} tests taken`)).waitFor();
  const untouched = page.getByRole('listitem').filter({ hasText: 'Positioning of X1' }).last();
  expect(await untouched.getByLabel('Not taken because').inputValue()).toBe('not-touched');

  await page.getByRole('button', { name: 'Make the plan' }).click();
  await planMade(page);
  const group = page.getByRole('region', { name: 'Rotary axes', exact: true });
  await group
    .getByText(/tests? · .*min to measure/)
    .first()
    .waitFor();
  await page.getByRole('link', { name: /Positioning of B1/ }).waitFor();
  expect(await page.getByRole('link', { name: /Positioning of X1/ }).count()).toBe(0);

  await page.getByRole('button', { name: 'Keep this plan as a template' }).click();
  await page.getByLabel('Name').fill('After work on the swivel');
  await page.getByRole('button', { name: 'Keep the template' }).click();
  await page.getByText(/^Kept as “After work on the swivel”/).waitFor();

  // The next machine of the model is offered it; it only preselects.
  await page.goto(`/jobs/${await jobOn(page, wide, 'QMF-4002')}/plan`);
  const begin = page.getByLabel('Begin from');
  await begin.selectOption({ label: (await begin.getByText(/^Template “After work on the swivel”/).textContent())! });
  await page.getByRole('button', { name: 'Take over its selection' }).click();
  await page.getByText(`${all - rest} tests are taken.`, { exact: false }).waitFor();
  await page.getByText(new RegExp(`^${all - rest} of ${all} tests taken`)).waitFor();
  expect(faults).toEqual([]);
  await context.close();
});

/** Takes these tests only; everything else is not agreed. */
async function takeOnly(page: Page, titles: RegExp[]): Promise<void> {
  await page.getByRole('button', { name: 'Make the plan' }).waitFor();
  for (const name of [/^Take all/, /^Take none of these/]) {
    const press = page.getByRole('button', { name });
    while ((await press.count()) > 0) await press.first().click();
  }
  const left = page.getByRole('checkbox', { checked: true });
  while ((await left.count()) > 0) await left.first().uncheck();
  for (const group of await page.getByLabel(/none of these because$/).all())
    await group.selectOption({ label: 'not agreed' });
  for (const reason of await page.getByLabel('Not taken because').all())
    if ((await reason.inputValue()) === '') await reason.selectOption({ label: 'not agreed' });
  for (const name of titles) await page.getByRole('checkbox', { name }).check();
}

const check = /^Air supply after the move/;
const positioning = /^Positioning of X1/;

it('an own check and positioning: refused until confirmed, measured, issued with who confirmed', async () => {
  const admin = await visitor(browser, 'admin@quillmere.example');
  await composeCheck(admin.page);
  const { page, faults, context } = await visitor(browser, 'inspector@quillmere.example', widths.tablet);
  const jobId = await jobOn(page, 'Turning centre with one spindle', 'QMF-4003', { refuseUnconfirmed: true });
  await page.goto(`/jobs/${jobId}/plan`);
  await takeOnly(page, [check, positioning]);
  await page.getByRole('button', { name: 'Make the plan' }).click();
  await page.getByText(/^Positioning of X1: its tolerance is not confirmed/).waitFor();

  await admin.page.goto('/catalogue/iso-13041-4-2004/PO-A');
  await admin.page.getByText('Confirm, replace or withdraw').click();
  await admin.page.getByLabel('Edition of your copy').fill('2004, copy no. 1');
  await admin.page.getByLabel('Page or clause').fill('p. 9');
  await admin.page.getByRole('button', { name: 'Write it down' }).click();
  await admin.page.getByText('Written down').waitFor();

  await page.reload();
  await takeOnly(page, [check, positioning]);
  await page.getByRole('button', { name: 'Make the plan' }).click();
  await planMade(page);

  await answerCheck(page);
  await measurePositioning(page);

  await page.goto(`/jobs/${jobId}`);
  await page.getByRole('button', { name: /^As left = as found/ }).click();
  await page.getByRole('button', { name: 'Declare it for 2 sheets' }).click();
  await page.getByRole('button', { name: 'Hand in for the check' }).click();
  await page
    .getByText(/Handed in for the check|In check/)
    .first()
    .waitFor();
  const reviewer = await visitor(browser, 'reviewer@quillmere.example');
  await reviewer.page.goto(`/jobs/${jobId}/check`);
  const seen = reviewer.page.getByRole('checkbox', { name: /I have seen/ });
  await reviewer.page.getByRole('button', { name: 'Check and issue the report' }).waitFor();
  if (await seen.isVisible()) await seen.check();
  await reviewer.page.getByRole('button', { name: 'Check and issue the report' }).click();
  await reviewer.page.waitForURL(/\/reports\/[0-9a-f-]{36}/);
  await reviewer.page
    .getByText(/confirmed by M\. Sandiford/)
    .first()
    .waitFor();
  const reportId = reviewer.page.url().split('/reports/')[1]!.slice(0, 36);
  const text = flat((await pdfText(await reportPdf(reviewer.page, reportId, 'issued'))).text);
  expect(text).toContain('confirmed by M. Sandiford');
  expect(text).toContain('Air supply after the move');
  expect(text).toContain('5.2 bar (4.5 to 6)');
  expect(text).toContain('1 of 1 in order');
  expect([...faults, ...admin.faults, ...reviewer.faults]).toEqual([]);
  await Promise.all([context.close(), admin.context.close(), reviewer.context.close()]);
});

async function composeCheck(page: Page): Promise<void> {
  await page.goto('/catalogue/own/new?measure=function-check');
  await page.getByLabel('Own number').fill('own-41');
  await page.getByLabel('Title', { exact: true }).fill('Air supply after the move');
  await page.getByLabel('Steps, a line each').fill('Open the valve and read the gauge.\nListen along the hoses.');
  await page.getByLabel('Done on').selectOption({ label: 'the whole machine, once' });
  await page.getByRole('textbox', { name: 'Item 1' }).fill('Pressure is as our sheet says');
  await page.getByLabel('With a figure').first().check();
  await page.getByLabel('Which figure').fill('pressure');
  await page.getByLabel('Unit', { exact: true }).fill('bar');
  await page.getByLabel('At least').fill('4.5');
  await page.getByLabel('At most').fill('6');
  await page.getByRole('button', { name: 'Add an item' }).click();
  await page.getByRole('textbox', { name: 'Item 2' }).fill('No hose leaks');
  await page.getByRole('button', { name: 'Keep this test' }).click();
  await page.waitForURL('**/catalogue/own/OWN-41');
}

async function answerCheck(page: Page): Promise<void> {
  await page.getByRole('link', { name: /Air supply after the move/ }).click();
  await page.waitForURL(/\/sheets\//);
  const item = (words: string): Locator => page.getByRole('group', { name: new RegExp(words) });
  const pressure = page.getByLabel(/^Pressure is as our sheet says – pressure/);
  // A tap for the first answer, keys for the second.
  await item('Pressure is').getByText('yes', { exact: true }).click();
  await pressure.fill('7,1');
  await pressure.press('Enter');
  await item('No hose leaks').getByRole('radio', { name: 'yes' }).focus();
  await page.keyboard.press('Space');
  await page.getByText('2 of 2 answered, 1 not in order').waitFor();
  await pressure.fill('5,2');
  await pressure.press('Enter');
  await page.getByText('2 of 2 answered, all in order').waitFor();
  const remark = page.getByLabel('No hose leaks – remark');
  await remark.fill('one clip changed');
  await remark.blur();

  const png = await sharp({ create: { width: 8, height: 6, channels: 3, background: '#7a8' } })
    .png()
    .toBuffer();
  const add = async (name: string) => {
    await page.getByLabel('Add a photo').setInputFiles({ name: 'gauge.png', mimeType: 'image/png', buffer: png });
    await page.getByLabel('Belongs to').selectOption({ label: 'Pressure is as our sheet says' });
    await page.getByLabel('What it shows, prints below it').fill(name);
    await page.getByRole('button', { name: 'Add this photo' }).click();
    await page.getByRole('img', { name }).waitFor();
  };
  await add('gauge at rest');
  await add('gauge again');
  await page.getByRole('button', { name: 'Take photo 2 away' }).click();
  await page.getByRole('img', { name: 'gauge again' }).waitFor({ state: 'detached' });
  await allOnServer(page);
  await expectAccessible(page, 'function check');

  await openJobBoard(page, 'QMF-4003');
  await page.getByRole('link', { name: /Air supply after the move.*in order/ }).click();
  await page.getByText('2 of 2 answered, all in order').waitFor();
  expect(await pressure.inputValue()).toBe('5,2');
  expect(await remark.inputValue()).toBe('one clip changed');
  expect(await item('No hose leaks').getByRole('radio', { name: 'yes' }).isChecked()).toBe(true);
  await page.getByRole('img', { name: 'gauge at rest' }).waitFor();
  expect(await page.getByRole('img', { name: /gauge/ }).count()).toBe(1);
}

async function measurePositioning(page: Page): Promise<void> {
  await openJobBoard(page, 'QMF-4003');
  await page.getByRole('link', { name: /Positioning of X1/ }).click();
  await page.waitForURL(/\/sheets\//);
  await chooseInstrument(page, /IN-02/);
  const fields = readingFields(page);
  await fields.first().focus();
  await typeReadings(page, ['1', '−2', '0.5']);
  const all = await fields.count();
  expect(all).toBe(50);
  // Enter has led along the sheet's own order: three fields are filled, each with its own reading.
  const filled = await fields.evaluateAll((inputs) =>
    inputs.map((input) => (input as HTMLInputElement).value).filter(Boolean),
  );
  expect(filled.sort()).toEqual(['0.5', '1', '−2'].sort());

  const targets = await page
    .getByLabel(/target position|target in row|– target/i)
    .evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value).filter(Boolean));
  const at = [...new Set(targets)];
  expect(at).toHaveLength(5);
  const runs = [0, 1, 2, 3, 4];
  const lines = at.map((target, row) => [
    target,
    ...runs.map((run) => row + run / 10),
    ...runs.map((run) => row - 1 + run / 10),
  ]);
  const heads = ['target', ...runs.map(() => 'forward'), ...runs.map(() => 'backward')];
  await page.getByRole('button', { name: 'Readings from a text' }).click();
  const dialog = page.getByRole('dialog', { name: 'Readings from a text' });
  await dialog.getByLabel('Or a file').setInputFiles({
    name: 'x1.txt',
    mimeType: 'text/plain',
    buffer: Buffer.from([heads, ...lines].map((line) => line.join('\t')).join('\n')),
  });
  await dialog.getByText('What will be filled in:', { exact: false }).waitFor();
  const over = dialog.getByLabel('Write over it');
  if (await over.isVisible()) await over.check();
  await dialog.getByRole('button', { name: 'Take over' }).click();
  await dialog.waitFor({ state: 'hidden' });
  const further = page.getByRole('table', { name: 'Further limits' });
  await further.waitFor();
  expect(await further.getByRole('rowheader').count()).toBeGreaterThan(2);
  await page.getByText('within tolerance').first().waitFor();
  await allOnServer(page);
  await expectAccessible(page, 'positioning');
  expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
}
