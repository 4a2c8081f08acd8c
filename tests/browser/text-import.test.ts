import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, visitor, widths } from '@/tests/helpers/browser';
import { allOnServer, openJobBoard, readingFields } from '@/tests/helpers/line';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser?.close();
});

it('readings of a straightness from a text: looked at, explained, taken over, taken back', async () => {
  const { page, faults, context } = await visitor(browser, 'inspector@quillmere.example', widths.tablet);
  await openJobBoard(page, 'QMF-2087');
  await page
    .getByRole('link', { name: /straight/i })
    .first()
    .click();
  await page.waitForURL(/\/sheets\//);
  const fields = readingFields(page);
  await fields.first().waitFor();
  const before = await fields.evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value));

  await page.getByRole('button', { name: 'Readings from a text' }).click();
  const dialog = page.getByRole('dialog', { name: 'Readings from a text' });
  await dialog.waitFor();
  const takeOver = dialog.getByRole('button', { name: 'Take over' });
  expect(await takeOver.isDisabled()).toBe(true);

  // A file with decimal commas, a line of names and one figure that is none.
  await dialog.getByLabel('Or a file').setInputFiles({
    name: 'profile.txt',
    mimeType: 'text/plain',
    buffer: Buffer.from('position;reading\r\n0;0,000\r\n100;0,0015\r\n200;1.234,5\r\n300;0,001\r\n400;-0,0005\r\n'),
  });
  expect(await dialog.getByLabel('Columns parted by').inputValue()).toBe('semicolon');
  expect(await dialog.getByLabel('Decimal mark').inputValue()).toBe('comma');
  expect(await dialog.getByLabel('Lines to skip at the top').inputValue()).toBe('1');
  expect(await dialog.getByLabel('Column 1 holds').inputValue()).toBe('position');
  expect(await dialog.getByLabel('Column 2 holds').inputValue()).toBe('reading');
  await dialog.getByLabel('Unit of reading').selectOption('mm');
  await dialog.getByLabel('take the place of the sheet', { exact: false }).check();
  await expect.poll(() => dialog.getByText(/thousands marks are not read/).isVisible()).toBe(true);
  expect(await dialog.getByText('Line 4:').isVisible()).toBe(true);
  expect(await dialog.getByText('What will be filled in: 8 figures').isVisible()).toBe(true);
  await expectAccessible(page, 'text import');
  expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
  expect(await fields.evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value))).toEqual(
    before,
  );

  expect(await takeOver.isDisabled()).toBe(true);
  await dialog.getByLabel('Leave these lines out and take the rest').check();
  if (await dialog.getByText('Something stands there already').isVisible()) {
    expect(await takeOver.isDisabled()).toBe(true);
    await dialog.getByLabel('Write over it').check();
  }
  await takeOver.click();
  await dialog.waitFor({ state: 'hidden' });
  await expect.poll(() => page.getByText(/8 figures taken over from the text/).isVisible()).toBe(true);
  await expect.poll(() => fields.nth(1).inputValue()).toBe('0,0015 mm');
  await expect.poll(() => fields.count()).toBe(4);
  await allOnServer(page);

  await page.reload({ waitUntil: 'networkidle' });
  await expect.poll(() => readingFields(page).nth(1).inputValue()).toBe('0,0015 mm');
  await readingFields(page).first().focus();
  await page.keyboard.press('Control+z');
  await expect
    .poll(() => readingFields(page).evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value)))
    .toEqual(before);
  await allOnServer(page);
  expect(faults).toEqual([]);
  await context.close();
});
