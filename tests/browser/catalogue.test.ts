import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, visitor } from '@/tests/helpers/browser';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser?.close());

const administrator = () => visitor(browser, 'admin@quillmere.example');
const tolerance = { exact: true };

describe('the composer', () => {
  it('draws the sheet while it is composed, says what is missing at its field, and keeps versions', async () => {
    const { page, faults, context } = await administrator();
    await page.goto('/catalogue/own/new');
    await page.getByRole('button', { name: 'Keep this test' }).click();
    await page.getByText('The title is missing.').waitFor();
    await page.getByLabel('Own number').fill('own-21');
    await page.getByLabel('What is measured').selectOption({ label: 'Squareness of two motions, square turned over' });
    await page.getByLabel('Title', { exact: true }).fill('Y to X by our own square');
    await page
      .getByLabel('Steps, a line each')
      .fill('Set the square up.\nRead both arms; back at the first it must show the same.');
    await page.getByLabel('Given', { exact: true }).selectOption({ label: 'one figure for all machines' });
    await page.getByLabel('Tolerance, µm', tolerance).fill('12');
    await page.getByLabel('Exactly', { exact: true }).fill('our drawing 7, sheet 1');
    await page.getByRole('button', { name: 'Keep this test' }).click();
    await page.getByText('say what a positive figure means').waitFor();
    await page.getByLabel('A positive figure means').fill('more than 90°');
    await page.getByLabel('A negative figure means').fill('less than 90°');

    // The sheet beside it is the one that an inspector will have: it judges what is tried.
    const sheet = page.locator('#try-out');
    await expect.poll(() => sheet.locator('input[data-role=reading]').count(), { timeout: 10_000 }).toBe(12);
    const readings = await sheet.locator('input[data-role=reading]').all();
    for (const [index, reading] of readings.entries()) await reading.fill(String(index % 3));
    await sheet.getByText('within tolerance').first().waitFor();

    await page.getByRole('button', { name: 'Keep this test' }).click();
    await page.waitForURL('**/catalogue/own/OWN-21');
    await page.getByRole('link', { name: 'Make a new version' }).click();
    await page.waitForURL('**/new-version');
    await page.getByLabel('Tolerance, µm', tolerance).fill('11');
    await page.getByRole('button', { name: 'Keep as version 2' }).click();
    await page.waitForURL('**/catalogue/own/OWN-21');
    await page.getByText('0.011').first().waitFor();
    await page.getByRole('link', { name: '1', exact: true }).click();
    await page.getByText('An older version').waitFor();
    await page.getByRole('button', { name: 'Withdraw' }).click();
    await page.getByRole('button', { name: 'Withdraw it' }).click();
    await page.getByText('withdrew it on').waitFor();
    expect(faults).toEqual([]);
    await context.close();
  });
});

describe('the values of a tolerance', () => {
  it('are written down by one person, looked up by a second, and taken over from a table', async () => {
    const { page, faults, context } = await administrator();
    await page.goto('/settings');
    await page.getByLabel('Two people confirm a tolerance').check();
    await page.getByRole('button', { name: 'Save this' }).click();
    await page.getByText('Saved').first().waitFor();

    await page.goto('/catalogue/iso-13041-1-2020/TU-3');
    await page.getByText('Confirm, replace or withdraw').click();
    await page.getByLabel('replaced by our own figure').check();
    await page.getByRole('button', { name: 'Write it down' }).click();
    await page.getByText('Page or clause is missing.').waitFor();
    await page.getByLabel('all sizes, µm').fill('26');
    await page.getByLabel('Edition of your copy').fill('2020, copy no. 3');
    await page.getByLabel('Page or clause').fill('p. 40');
    await page.getByRole('button', { name: 'Write it down' }).click();
    await page.getByText('Written down').waitFor();
    await page.getByText('Somebody else has to look it up too.').waitFor();

    const second = await visitor(browser, 'reviewer@quillmere.example');
    await second.page.goto('/catalogue?show=waiting');
    await second.page.getByRole('rowheader').getByRole('link').first().click();
    await second.page.getByRole('button', { name: /I have looked it up too/ }).click();
    await second.page
      .getByText(/replaced by .* and .* on/)
      .first()
      .waitFor();

    const table = await (await page.request.get('/api/catalogue/values.csv')).text();
    const confirmed = table.replace(
      /^(ISO 13041-1,2020,AX-1b,.*?),unconfirmed,,,,,,\r$/m,
      '$1,confirmed,,,2020,p. 3,,\r',
    );
    expect(confirmed).not.toBe(table);
    // A file chosen before the page listens would go unseen.
    await page.goto('/catalogue/values', { waitUntil: 'networkidle' });
    const file = page.getByLabel('The file', { exact: true });
    const upload = (text: string) =>
      file.setInputFiles({ name: 'values.csv', mimeType: 'text/csv', buffer: Buffer.from(text) });
    await upload(`${confirmed}x,y\r\n`);
    await page.getByText('The file cannot be taken over').waitFor();
    expect(await page.getByRole('button', { name: /Take over/ }).count()).toBe(0);
    await upload(confirmed);
    await page.getByRole('button', { name: 'Take over 1 change' }).click();
    await page.getByText('1 changed').waitFor();

    await page.goto('/settings');
    await page.getByLabel('Two people confirm a tolerance').uncheck();
    await page.getByRole('button', { name: 'Save this' }).click();
    await page.getByText('Saved').first().waitFor();
    expect([...faults, ...second.faults]).toEqual([]);
    await second.context.close();
    await context.close();
  });
});
