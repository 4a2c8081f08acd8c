import { PDFParse } from 'pdf-parse';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, visitor } from '@/tests/helpers/browser';
import { reportPdf } from '@/tests/helpers/line';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser?.close());

it('customer signs acceptance', async () => {
  const { page, faults, context } = await visitor(browser, 'customer@ashdown.example');
  // Home shows what waits for the person looking: the report of QMF-2083.
  await page.goto('/');
  await page
    .getByRole('link', { name: /LK32-0081-8|QMF-\d{4}-\d{6}/ })
    .first()
    .click();
  await page.waitForURL(/\/reports\//);
  const reportId = page.url().split('/reports/')[1]!.split(/[/?#]/)[0]!;
  await expect.poll(() => page.getByText('LK32-0081-8').first().isVisible()).toBe(true);
  await expectAccessible(page, 'report to be signed');

  // Accepting opens when the deviations have been in view; nothing is ticked beforehand.
  await page.locator('#in-short').scrollIntoViewIfNeeded();
  const accept = page.getByRole('radio', { name: /^Accept The machine/ });
  await accept.scrollIntoViewIfNeeded();
  await expect.poll(() => accept.isEnabled()).toBe(true);
  await accept.check();
  const confirmation = page.getByRole('checkbox', { name: 'This sentence is what I sign.' });
  expect(await confirmation.isChecked()).toBe(false);
  await page.getByRole('radio', { name: 'Type the name' }).check();
  await page.getByLabel('Your name, typed as your signature').fill('C. Vale');
  await page.getByRole('button', { name: 'Sign and accept', exact: true }).click();
  await expect
    .poll(() => page.getByText('Please confirm the sentence above the button.').first().isVisible())
    .toBe(true);
  await confirmation.check();
  await page.getByRole('button', { name: 'Sign and accept', exact: true }).dblclick();
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

  const facts = await (await page.request.get(`/api/reports/${reportId}`)).json();
  expect(facts.state).toBe('signed');
  expect(facts.signatures.filter((signature: { role: string }) => signature.role === 'customer')).toHaveLength(1);
  const pdf = new PDFParse({ data: await reportPdf(page, reportId, 'signed') });
  const text = (await pdf.getText()).text.normalize('NFKC');
  await pdf.destroy();
  expect(text).toContain('C. Vale');
  expect(text).toContain('LK32-0081-8');

  // Signed once is signed: the page offers no second answer, and the interface refuses one.
  await page.reload();
  expect(await page.getByRole('radio', { name: /Accept/ }).count()).toBe(0);
  expect(faults).toEqual([]);
  await context.close();
});
