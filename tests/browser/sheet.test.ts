import createKnex, { type Knex } from 'knex';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { expectAccessible, launchBrowser, visitor, widths } from '@/tests/helpers/browser';
import { allOnServer, openJobBoard, readingFields, typeReadings } from '@/tests/helpers/line';

let browser: Browser;
let owner: Knex;
beforeAll(async () => {
  browser = await launchBrowser();
  owner = createKnex({ client: 'pg', connection: inject('application').ownerUrl });
});
afterAll(async () => {
  await browser?.close();
  await owner?.destroy();
});

/** What the database holds of a set of readings, looked at from outside of the application. */
async function storedReadings(passOf: string): Promise<{ pointer: string; text: string; value: string | null }[]> {
  return owner.transaction(async (trx): Promise<{ pointer: string; text: string; value: string | null }[]> => {
    const { organisation_id } = await trx('organisations').where('name', 'like', 'Quillmere%').first();
    await trx.raw(
      `select set_config('app.organisation', ?, true), set_config('app.customer', 'staff', true), set_config('app.account', ?, true)`,
      [organisation_id, organisation_id],
    );
    const rows: { pointer: string; text: string; value: string | null }[] = await trx('readings')
      .join('passes', 'passes.id', 'readings.pass_id')
      .where('passes.sheet_id', passOf)
      .whereNot('readings.source', 'planned')
      .orderBy('readings.pointer')
      .select('readings.pointer', 'readings.text', 'readings.value');
    return rows;
  });
}

it('inspector fills in a standard test sheet', async () => {
  const { page, faults, context } = await visitor(browser, 'inspector@quillmere.example', widths.tablet);
  await openJobBoard(page, 'QMF-2087');
  await page
    .getByRole('link', { name: /X1 motion square to the axis of main spindle S1/ })
    .first()
    .click();
  await page.waitForURL(/\/sheets\//);
  const sheetId = page.url().split('/sheets/')[1]!.split(/[?#]/)[0]!;

  // The sheet shows what a person needs before the first reading.
  await expect.poll(() => page.getByRole('img', { name: /X1/ }).first().isVisible()).toBe(true);
  expect(
    await page
      .getByText(/Isolate and lock out/)
      .first()
      .isVisible(),
  ).toBe(true);
  expect(
    await page
      .getByText(/to be confirmed/)
      .first()
      .isVisible(),
  ).toBe(true);

  const fields = readingFields(page);
  const count = await fields.count();
  const positions = count / 2;
  // Down at 0°, then down at 180°: the disc's own run-out cancels, the slide rises by 2 µm a position (concave).
  const at = (sign: number) =>
    Array.from({ length: positions }, (_, row) => (sign * 3 - row).toFixed(0).replace('-', '−'));
  await fields.first().focus();
  await typeReadings(page, at(1));
  expect(
    await page
      .getByText(/still to be taken/)
      .first()
      .isVisible(),
  ).toBe(true);
  await typeReadings(page, at(-1));

  await expect
    .poll(() =>
      page
        .getByText(/within tolerance/)
        .first()
        .isVisible(),
    )
    .toBe(true);
  expect(
    await page
      .getByText(/concave/)
      .first()
      .isVisible(),
  ).toBe(true);
  await allOnServer(page);
  await expectAccessible(page, 'sheet');

  // A slip is put right; the verdict follows at the keystroke, before anything is sent.
  const last = fields.last();
  const good = await last.inputValue();
  await last.fill('77');
  await expect
    .poll(() =>
      page
        .getByText(/out of tolerance/)
        .first()
        .isVisible(),
    )
    .toBe(true);
  await last.fill(good);
  await last.press('Enter');
  await expect.poll(() => page.getByText(/out of tolerance/).count()).toBe(0);
  await allOnServer(page);

  // What cannot be read is said at the field, and stays as it was typed.
  await fields.first().fill('1,2,3');
  await fields.first().blur();
  await expect
    .poll(() =>
      page
        .getByText(/Cannot be read|two decimal marks|decimal mark/i)
        .first()
        .isVisible(),
    )
    .toBe(true);
  await fields.first().fill('3');
  await fields.first().press('Enter');
  await allOnServer(page);

  // What stood there before is kept, and shown on demand.
  await page.getByText('Readings that were put right').click();
  await expect.poll(() => page.getByRole('cell', { name: '1,2,3' }).first().isVisible()).toBe(true);

  await page.reload();
  await expect.poll(() => readingFields(page).last().inputValue()).toBe(good);
  await expect
    .poll(() =>
      page
        .getByText(/within tolerance/)
        .first()
        .isVisible(),
    )
    .toBe(true);
  const stored = await storedReadings(sheetId);
  expect(stored).toHaveLength(count);
  expect(stored.every((row) => row.value !== null && row.value === row.text.replace('−', '-'))).toBe(true);
  expect(faults).toEqual([]);
  await context.close();
});

it('nothing typed is lost when the server is away and the page is loaded again', async () => {
  const { page, context } = await visitor(browser, 'inspector@quillmere.example');
  await openJobBoard(page, 'QMF-2087');
  await page
    .getByRole('link', { name: /Two-collar cutting test/ })
    .first()
    .click();
  await page.waitForURL(/\/sheets\//);
  await readingFields(page).first().waitFor();

  await page.route('**/api/sheets/*/operations', (route) => route.abort());
  await readingFields(page).first().focus();
  await typeReadings(page, ['40,012', '40,007']);
  // A comma and three figures: how it is understood is said at the field.
  await expect.poll(() => page.getByText('read as 40.012 mm').isVisible()).toBe(true);
  await expect
    .poll(() =>
      page
        .getByText(/On this device: \d+ waiting/)
        .first()
        .isVisible(),
    )
    .toBe(true);
  await expect
    .poll(() =>
      page
        .getByText(/within tolerance|out of tolerance/)
        .first()
        .isVisible(),
    )
    .toBe(true);

  await page.reload();
  await expect.poll(() => readingFields(page).first().inputValue()).toBe('40,012');
  expect(await readingFields(page).last().inputValue()).toBe('40,007');
  await page.unroute('**/api/sheets/*/operations');
  const sendNow = page.getByRole('button', { name: 'Send now' });
  if (await sendNow.isVisible()) await sendNow.click();
  await allOnServer(page);
  await context.close();
});
