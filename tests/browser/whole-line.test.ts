import { PDFParse } from 'pdf-parse';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, visitor, widths } from '@/tests/helpers/browser';
import { allOnServer, chooseInstrument, readingFields, reportPdf, typeReadings } from '@/tests/helpers/line';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser?.close());

const serial = 'WX-0O1I-7Z';

async function registerMachine(page: Page): Promise<void> {
  await page.goto('/machines/new');
  await page.getByLabel('Manufacturer').fill('Harrow & Pell');
  await page.getByLabel('Model').fill('TC 180');
  await page.getByLabel(/^Serial number/).fill(serial);
  await page.getByLabel(/^Year/).fill('2023');
  await page
    .getByLabel(/owner|customer/i)
    .first()
    .selectOption({ label: 'Ashdown Turned Parts' });
  await page.getByRole('button', { name: 'Register the machine' }).click();
  await page.waitForURL(/\/machines\/[0-9a-f-]{36}$/);
}

async function openJob(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Open a job' }).first().click();
  await page.waitForURL(/\/jobs\/new/);
  await page.getByLabel(/^Reference/).fill('QMF-3001');
  await page.getByLabel('Customer', { exact: true }).selectOption({ label: 'Ashdown Turned Parts' });
  await page.getByRole('radio', { name: 'periodic check' }).check();
  await page.getByLabel('First day').fill('2026-11-16');
  const inspectors = page.getByRole('group', { name: 'Who measures' });
  await inspectors.getByRole('checkbox').first().setChecked(true);
  const reviewers = page.getByRole('group', { name: 'Who has the check' });
  await reviewers.getByRole('checkbox').first().setChecked(true);
  await page.getByRole('button', { name: 'Open the job' }).click();
  await page.waitForURL(/\/jobs\/[0-9a-f-]{36}\/plan/);
}

/** Nose run-out only: everything else is not taken, each with its reason, which prints. */
async function makePlan(page: Page): Promise<void> {
  const make = page.getByRole('button', { name: 'Make the plan' });
  await make.waitFor();
  for (const box of await page.getByRole('checkbox').all()) {
    const test = await box.evaluate((element) => (element as HTMLInputElement).labels?.[0]?.textContent ?? '');
    if (!/Nose of main spindle/.test(test)) await box.uncheck();
  }
  // Without a reason nothing is made, and the summary leads to what is missing.
  await make.click();
  await expect.poll(() => page.getByText('The plan is not complete').isVisible()).toBe(true);
  for (const reason of await page.getByLabel('Not taken because').all())
    await reason.selectOption({ label: 'not agreed' });
  await make.click();
  await page.waitForURL(/\/jobs\/[0-9a-f-]{36}$/);
}

it('walks the whole line from registration to a signed report that is found again', async () => {
  const inspector = await visitor(browser, 'inspector@quillmere.example', widths.tablet);
  const { page } = inspector;
  await registerMachine(page);
  await expectAccessible(page, 'machine');
  await openJob(page);
  await makePlan(page);
  const jobUrl = new URL(page.url()).pathname;
  expect(await page.getByText('not agreed').first().isVisible()).toBe(true);

  await page
    .getByRole('link', { name: /Nose of main spindle S1/ })
    .first()
    .click();
  await page.waitForURL(/\/sheets\//);
  await chooseInstrument(page, /IN-02/);
  await readingFields(page).first().focus();
  await typeReadings(page, ['0', '1.2', '2', '1,6', '0.4', '−0.8', '-1', '−0,6', '0.2']);
  await expect
    .poll(() =>
      page
        .getByText(/within tolerance/)
        .first()
        .isVisible(),
    )
    .toBe(true);
  await allOnServer(page);

  await page.goto(jobUrl);
  await page
    .getByRole('button', { name: /^As left = as found/ })
    .first()
    .click();
  await page.getByRole('button', { name: 'Declare it for 1 sheet' }).click();
  await expect
    .poll(() => page.getByRole('button', { name: 'Hand in for the check' }).isVisible(), { timeout: 15_000 })
    .toBe(true);
  await page.getByRole('button', { name: 'Hand in for the check' }).click();
  await expect
    .poll(() =>
      page
        .getByText(/Handed in for the check|In check/)
        .first()
        .isVisible(),
    )
    .toBe(true);

  const reviewer = await visitor(browser, 'reviewer@quillmere.example');
  await reviewer.page.goto(`${jobUrl}/check`);
  await expectAccessible(reviewer.page, 'check');
  const confirm = reviewer.page.getByRole('checkbox', { name: /I have seen/ });
  if (await confirm.isVisible()) await confirm.check();
  await reviewer.page.getByRole('button', { name: 'Check and issue the report' }).dblclick();
  await reviewer.page.waitForURL(/\/reports\/[0-9a-f-]{36}/, { timeout: 20_000 });
  const reportId = reviewer.page.url().split('/reports/')[1]!.split(/[/?#]/)[0]!;
  const issued = await (await reviewer.page.request.get(`/api/reports/${reportId}`)).json();
  expect(issued.model.headline).toContain('1 of 1 judged test within tolerance');

  // Figures printed are the stored ones: total reading 2.0 − (−1.0) = 3.0 µm.
  const stored = issued.model.summary[0];
  expect(stored.asFound).toBe('0.0030');
  const parse = new PDFParse({ data: await reportPdf(reviewer.page, reportId, 'issued') });
  const pages = await parse.getText();
  const text = pages.text.normalize('NFKC');
  for (const figure of [stored.asFound, stored.toleranceMm, serial, issued.number, 'QMF-3001', 'IN-02'])
    expect(text).toContain(figure);
  for (const sheet of pages.pages) {
    expect(sheet.text.normalize('NFKC')).toContain(serial);
    expect(sheet.text).toMatch(new RegExp(`page ${sheet.num} of ${pages.total}`));
  }
  await parse.destroy();

  // The customer signs on the inspector's tablet, with a drawn signature.
  await page.goto(`/reports/${reportId}/sign-here`);
  await expectAccessible(page, 'signing on the tablet');
  await page.locator('#in-short').scrollIntoViewIfNeeded();
  const accept = page.getByRole('radio', { name: /^Accept The machine/ });
  await accept.scrollIntoViewIfNeeded();
  await expect.poll(() => accept.isEnabled()).toBe(true);
  await accept.check();
  await page.getByLabel('Name', { exact: true }).fill('C. Vale');
  const pad = page.locator('svg[role="img"], canvas, [data-signature-pad]').last();
  await page.getByText('Sign on the line in this field').scrollIntoViewIfNeeded();
  const box = (await pad.boundingBox())!;
  await page.mouse.move(box.x + 40, box.y + box.height / 2);
  await page.mouse.down();
  for (let step = 1; step < 12; step++)
    await page.mouse.move(box.x + 40 + step * 14, box.y + box.height / 2 + (step % 2 ? -24 : 24));
  await page.mouse.up();
  await page.getByRole('checkbox', { name: 'This sentence is what I sign.' }).check();
  await page.getByRole('button', { name: 'Sign and accept', exact: true }).click();
  await expect
    .poll(
      () =>
        page
          .getByText(/accepted/i)
          .first()
          .isVisible(),
      { timeout: 20_000 },
    )
    .toBe(true);
  const signed = await (await reviewer.page.request.get(`/api/reports/${reportId}`)).json();
  expect(signed.state).toBe('signed');
  const customer = signed.signatures.find((signature: { role: string }) => signature.role === 'customer');
  expect(customer).toMatchObject({ method: 'on-tablet', witness: 'T. Orrell', name: 'C. Vale' });
  expect(customer.strokes.length).toBeGreaterThan(0);

  // Nothing typed afterwards changes what was signed.
  await page.goto(jobUrl);
  await reviewer.page.goto('/archive?q=wxoo1i7');
  await reviewer.page
    .getByRole('link', { name: new RegExp(serial) })
    .first()
    .click();
  await reviewer.page
    .getByRole('link', { name: new RegExp(issued.number) })
    .first()
    .click();
  await reviewer.page.waitForURL(new RegExp(reportId));
  expect(inspector.faults).toEqual([]);
  expect(reviewer.faults).toEqual([]);
  await inspector.context.close();
  await reviewer.context.close();
});
