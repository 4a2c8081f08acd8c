import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { expectAccessible, goToSearch, launchBrowser, visitor } from '@/tests/helpers/browser';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser?.close());

it('archive look-up by machine serial', async () => {
  const { page, faults, context } = await visitor(browser, 'reviewer@quillmere.example');
  const look = async (text: string) => {
    // "/" leads to the box from any page.
    await page.goto('/machines');
    await page.locator('body').click({ position: { x: 5, y: 400 } });
    await goToSearch(page);
    await page.keyboard.type(text);
    await page.keyboard.press('Enter');
    await page.waitForURL(/\/(archive|machines\/)/);
  };
  // As printed: straight to the machine.
  await look('QT-10-0DB1');
  await page.waitForURL(/\/machines\/[0-9a-f-]{36}/);
  expect(await page.getByRole('heading', { level: 1 }).textContent()).toContain('QT-10-0DB1');

  // Another serial number looks the same: nobody is led to one of the two without having seen both.
  await look('LK32-0O81-B');
  await expect
    .poll(() =>
      page
        .getByRole('link', { name: /LK32-0O81-B/ })
        .first()
        .isVisible(),
    )
    .toBe(true);
  expect(
    await page
      .getByRole('link', { name: /LK32-0081-8/ })
      .first()
      .isVisible(),
  ).toBe(true);

  // Small letters, no dashes, O for 0: both look-alikes are offered, the machine that was meant among them.
  await look('lk32oo81');
  await expect
    .poll(() =>
      page
        .getByRole('link', { name: /LK32-0O81-B/ })
        .first()
        .isVisible(),
    )
    .toBe(true);
  expect(
    await page
      .getByRole('link', { name: /LK32-0081-8/ })
      .first()
      .isVisible(),
  ).toBe(true);
  await expectAccessible(page, 'archive');

  // A part of it; two clicks to a signed report.
  await look('1I10');
  await page
    .getByRole('link', { name: /HP25-1I10-S5/ })
    .first()
    .click();
  await page.waitForURL(/\/machines\//);
  await page
    .getByRole('link', { name: /QMF-\d{4}-\d{6}/ })
    .first()
    .click();
  await page.waitForURL(/\/reports\//);
  await expect.poll(() => page.getByText('HP25-1I10-S5').first().isVisible()).toBe(true);

  await look('nothing-like-this');
  await expect
    .poll(() =>
      page
        .getByText(/nothing|no machine/i)
        .first()
        .isVisible(),
    )
    .toBe(true);
  expect(faults).toEqual([]);
  await context.close();
});

it('a customer finds its own machines only, another organisation finds none', async () => {
  const customer = await visitor(browser, 'customer@ashdown.example');
  await customer.page.goto('/archive?q=SW20Z');
  await expect
    .poll(() =>
      customer.page
        .getByText(/nothing|no machine/i)
        .first()
        .isVisible(),
    )
    .toBe(true);
  expect(await customer.page.getByRole('link', { name: /SW20Z/ }).count()).toBe(0);
  await customer.page.goto('/archive?q=LK32');
  await expect
    .poll(() =>
      customer.page
        .getByRole('link', { name: /LK32-0O81-B/ })
        .first()
        .isVisible(),
    )
    .toBe(true);
  await customer.context.close();
  const stranger = await visitor(browser, 'admin@brackwater.example');
  await stranger.page.goto('/archive?q=LK32');
  await expect
    .poll(() =>
      stranger.page
        .getByText(/nothing|no machine/i)
        .first()
        .isVisible(),
    )
    .toBe(true);
  await stranger.context.close();
});
