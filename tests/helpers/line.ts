import type { Page } from 'playwright-core';
import { expect } from 'vitest';

/** Steps of the main job as a person takes them, used by the browser tests. */

export async function openJobBoard(page: Page, reference: string): Promise<void> {
  await page.goto('/jobs');
  await page.getByRole('link', { name: reference }).first().click();
  await page.getByRole('heading', { name: 'The plan, in working order' }).waitFor();
}

/** Types one reading after another, Enter after each, as an indicator's cable does it. */
export async function typeReadings(page: Page, readings: string[]): Promise<void> {
  for (const reading of readings) await page.keyboard.type(`${reading}\n`, { delay: 1 });
}

export const readingFields = (page: Page) => page.locator('input[data-role="reading"]');

/** Waits until the sheet says that nothing is waiting on this device any more. */
export async function allOnServer(page: Page): Promise<void> {
  await expect
    .poll(
      () =>
        page
          .getByText(/^All on server/)
          .first()
          .isVisible(),
      { timeout: 20_000 },
    )
    .toBe(true);
}

/** Chooses the first instrument in date whose name says what it is. */
export async function chooseInstrument(page: Page, name: RegExp): Promise<void> {
  await page
    .getByRole('button', { name: /instruments/i })
    .first()
    .click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('checkbox', { name }).first().check();
  await dialog.getByRole('button', { name: 'Take these instruments' }).click();
  await dialog.waitFor({ state: 'hidden' });
}

/** Reads the PDF's text once the worker has drawn it. */
export async function reportPdf(page: Page, reportId: string, as: 'issued' | 'signed'): Promise<Uint8Array> {
  let bytes = new Uint8Array();
  await expect
    .poll(
      async () => {
        const answer = await page.request.get(`/api/reports/${reportId}/pdf?as=${as}`);
        if (answer.ok()) bytes = new Uint8Array(await answer.body());
        return answer.status();
      },
      { timeout: 120_000, interval: 1000 },
    )
    .toBe(200);
  return bytes;
}
