import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, visitor, widths } from '@/tests/helpers/browser';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser?.close());

const telephone = { width: 360, height: 740 };

/** Focuses a field of the form by its name, from where the keyboard types on. */
const into = (page: Page, label: string | RegExp) => page.getByLabel(label).first().focus();

async function opened(page: Page, method: string): Promise<void> {
  await page.goto(`/calculator/${method}`);
  // A key that comes before its script has been loaded is nobody's.
  await expect
    .poll(
      async () => {
        await page.getByRole('button', { name: 'Clear' }).click();
        return page.getByText('Cleared.').isVisible();
      },
      { timeout: 15_000 },
    )
    .toBe(true);
}

describe('the calculator, for somebody without an account', () => {
  it('leads from the sign-in page over the list to a method', async () => {
    const { page, faults, context } = await visitor(browser, null);
    await page.goto('/sign-in');
    await page.getByRole('link', { name: 'calculator' }).click();
    await page.waitForURL('**/calculator');
    await page.getByRole('link', { name: /^Parallelism of a motion/ }).click();
    await page.waitForURL('**/calculator/parallelism');
    await page.getByRole('heading', { name: 'What it is for' }).waitFor();
    expect(faults).toEqual([]);
    await context.close();
  });

  it('takes readings from the keyboard, shows result and steps, judges, and loses nothing in a reload', async () => {
    const { page, faults, context } = await visitor(browser, null);
    await opened(page, 'parallelism');
    await into(page, /z, row 1/);
    await page.keyboard.type('0');
    await page.keyboard.press('Enter');
    await into(page, /z, row 2/);
    await page.keyboard.type('300');
    await into(page, /z 0 mm, spindle at 0°/);
    // Down the first angle, then down the next, as it is measured.
    for (const reading of ['0', '0,012 mm', '4', '−2']) {
      await page.keyboard.type(reading);
      await page.keyboard.press('Enter');
    }
    await page.getByRole('heading', { name: 'How this figure came about' }).waitFor();
    const steps = page.locator('ol').filter({ hasText: 'Over the measuring length' });
    expect(await steps.textContent()).toContain('10 · 300 / 1000');
    expect(await steps.textContent()).toContain('3 µm');
    await page.getByText('for information').first().waitFor();

    await page.getByLabel('Tolerance, mm').fill('0,002');
    await page.getByText('out of tolerance').first().waitFor();
    await page.getByLabel('Tolerance, mm').fill('0.0.2');
    await page.getByText('more than one decimal mark').waitFor();
    await page.getByLabel('Tolerance, mm').fill('0.005');
    await page.getByText('within tolerance').first().waitFor();

    await page.reload();
    await page.getByText('within tolerance').first().waitFor();
    expect(
      await page
        .getByLabel(/z 300 mm, spindle at 0°/)
        .first()
        .inputValue(),
    ).toBe('0,012 mm');
    // A browser fills fields in again by itself; a choice counts from when the page listens.
    await expect
      .poll(
        async () => {
          await page.getByLabel('What is judged').selectOption('slope');
          await page.getByLabel('What is judged').selectOption('range');
          return page.locator('ol').getByText('Range of the means').isVisible();
        },
        { timeout: 15_000 },
      )
      .toBe(true);
    expect(
      await page
        .getByLabel(/z 300 mm, spindle at 180°/)
        .first()
        .inputValue(),
    ).toBe('−2');
    await expectAccessible(page, 'parallelism with a result');
    expect(faults).toEqual([]);
    await context.close();
  });

  it('lets a tolerance be typed key by key, and reads what was typed in the unit of the axis chosen last', async () => {
    const { page, faults, context } = await visitor(browser, null);
    await opened(page, 'positioning');
    await page.getByRole('button', { name: 'Fill in the example' }).click();
    await page.getByText('for information').first().waitFor();
    await page.getByLabel('Tolerance, mm').focus();
    await page.keyboard.type('0,0065', { delay: 60 });
    expect(await page.getByLabel('Tolerance, mm').inputValue()).toBe('0,0065');
    await page.getByText('out of tolerance').first().waitFor();
    await page.getByLabel('Axis').selectOption('rotary');
    await page.getByLabel('Tolerance, ″').waitFor();
    await page.locator('[data-at-foot]').getByText('1.4', { exact: true }).first().waitFor();
    expect(await page.getByText('does not fit here').count()).toBe(0);
    expect(faults).toEqual([]);
    await context.close();
  });

  it('says at a field what cannot be read, and goes on when it is put right', async () => {
    const { page, context } = await visitor(browser, null);
    await opened(page, 'tolerance');
    await page.getByText(/Still missing: Tolerance as given/).waitFor();
    await page.getByLabel('Tolerance as given').fill('15');
    await page.getByLabel('for a length of').fill('300');
    await page.getByLabel('Measured length').fill('240 µm/m');
    await page.getByText('does not fit here').first().waitFor();
    expect(await page.getByLabel('Tolerance as given').inputValue()).toBe('15');
    await page.getByLabel('Measured length').fill('240');
    await page.getByText('15 · 240 / 300').first().waitFor();
    await page.reload();
    await page.getByText('15 · 240 / 300').first().waitFor();
    await context.close();
  });

  it('sends the same calculation as a request and shows the answer, refusals too', async () => {
    const { page, faults, context } = await visitor(browser, null);
    await opened(page, 'two-collar');
    await page.getByRole('button', { name: 'Fill in the example' }).click();
    await page.getByRole('heading', { name: 'Figures' }).waitFor();
    await page.locator('summary', { hasText: 'As a request' }).click();
    const request = page.getByLabel('Request', { exact: true });
    expect(JSON.parse(await request.inputValue())).toMatchObject({ method: 'two-collar', D1: '30.012' });
    await page.getByRole('button', { name: 'Send it to the server' }).click();
    await page.getByText('Answer, status 200').waitFor();
    expect(await page.locator('pre').textContent()).toContain('"deviation": "2.5"');
    await request.fill('{"method":"two-collar","D1":"","D2":"30","distance":"100"}');
    await page.getByRole('button', { name: 'Send it to the server' }).click();
    await page.getByText('Answer, status 422').waitFor();
    expect(await page.locator('pre').textContent()).toContain('/D1');
    await page.getByRole('button', { name: 'Take it from the form again' }).click();
    expect(await request.inputValue()).toContain('30.012');
    expect(faults).toEqual([]);
    await context.close();
  });

  it('fits a telephone, a tablet and a desk, in the light and in the dark', async () => {
    const { page, faults, context } = await visitor(browser, null);
    for (const method of ['positioning', 'coaxiality', 'squareness', 'uncertainty', 'correct-pitch']) {
      await opened(page, method);
      await page.getByRole('button', { name: 'Fill in the example' }).click();
      await page.getByRole('heading', { name: 'How this figure came about' }).waitFor();
      for (const theme of ['light', 'dark'])
        for (const viewport of [telephone, widths.tablet, widths.desk]) {
          await page.setViewportSize(viewport);
          await page.evaluate((wanted) => document.documentElement.setAttribute('data-theme', wanted), theme);
          const wide = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
          expect(wide, `${method} at ${viewport.width}`).toBeLessThanOrEqual(0);
          await expectAccessible(page, `${method} at ${viewport.width}, ${theme}`);
        }
    }
    expect(faults).toEqual([]);
    await context.close();
  });
});
