import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible, launchBrowser, visitor, widths } from '@/tests/helpers/browser';
import { allOnServer, openJobBoard, readingFields } from '@/tests/helpers/line';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser?.close();
});

const inspector = 'inspector@quillmere.example';

async function openSheet(page: Page, title: RegExp): Promise<void> {
  await openJobBoard(page, 'QMF-2087');
  await page.getByRole('link', { name: title }).first().click();
  await page.waitForURL(/\/sheets\//);
  await readingFields(page).first().waitFor();
  // The line at the foot comes to life with the page: from here on keys are handled.
  await expect.poll(() => page.locator('#save-state').textContent()).toMatch(/server/);
}

const values = (page: Page) =>
  readingFields(page).evaluateAll((inputs) => inputs.map((input) => (input as HTMLInputElement).value));

describe('entry on a sheet', () => {
  it('takes every reading of an instrument that types like a keyboard, ended by Enter or Tab', async () => {
    const { page, context, faults } = await visitor(browser, inspector);
    await openSheet(page, /Lost motion of X1/);
    const count = await readingFields(page).count();
    const sent = Array.from({ length: count }, (_, k) => `${(k % 2 ? -1 : 1) * (1 + (k % 7) / 10)}`);
    await readingFields(page).first().focus();
    for (const [k, text] of sent.entries()) {
      await page.keyboard.type(text, { delay: 2 });
      await page.keyboard.press(k % 3 === 0 && text.length > 2 ? 'Tab' : 'Enter');
    }
    expect(await values(page)).toEqual(sent);
    await allOnServer(page);
    await page.reload();
    await expect.poll(() => values(page)).toEqual(sent);
    expect(faults).toEqual([]);
    await context.close();
  });

  it('fills down from a pasted column, takes it back at once, and restores a field with Escape', async () => {
    const { page, context } = await visitor(browser, inspector);
    await openSheet(page, /Lost motion of Z1/);
    await readingFields(page).first().focus();
    await page.evaluate(() => {
      const data = new DataTransfer();
      data.setData('text/plain', '1,2\n-0,4\n1,1\n-0,5\n');
      document.activeElement?.dispatchEvent(
        new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true }),
      );
    });
    expect((await values(page)).slice(0, 5)).toEqual(['1,2', '-0,4', '1,1', '-0,5', '']);
    await expect.poll(() => page.getByText(/4 values pasted/).isVisible()).toBe(true);
    await page.keyboard.press('Control+z');
    expect((await values(page)).slice(0, 4)).toEqual(['', '', '', '']);
    await page.keyboard.type('7', { delay: 80 });
    await page.keyboard.press('Escape');
    expect((await values(page))[0]).toBe('');
    await allOnServer(page);
    await context.close();
  });

  it('can be filled by taps on the keypad alone, and the field stays in sight', async () => {
    const { page, context } = await visitor(browser, inspector, widths.tablet);
    await openSheet(page, /Tool hole of turret T1/);
    await page.getByRole('button', { name: 'Keypad', exact: true }).click();
    const press = (name: string) => page.getByRole('button', { name, exact: true }).click();
    for (const figure of ['2', '0', '4', '6']) {
      await press(figure);
      await press('Decimal mark');
      await press('5');
      if (figure === '2') await press('Change the sign');
      const seen = await page.evaluate(() => {
        const box = document.activeElement!.getBoundingClientRect();
        return document.elementFromPoint(box.x + box.width / 2, box.y + box.height / 2) === document.activeElement;
      });
      expect(seen, `the field of ${figure} is covered`).toBe(true);
      await press('Next reading');
    }
    expect(await values(page)).toEqual(['-2.5', '0.5', '4.5', '6.5']);
    await allOnServer(page);
    await expectAccessible(page, 'sheet with keypad');
    await context.close();
  });

  it('says in the check what is missing, with the way to the field, in the words that stand there', async () => {
    const { page, context } = await visitor(browser, inspector);
    await openSheet(page, /Z1 motion parallel to the axis of main spindle S1, in YZ/);
    await readingFields(page).first().focus();
    await page.keyboard.type('1', { delay: 80 });
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: 'Check the sheet' }).click();
    expect(await page.evaluate(() => document.activeElement?.textContent)).toMatch(/missing in the readings as found/);
    const finding = page.getByRole('button', { name: /z 30 mm, spindle at 180°: Not read yet\./ });
    await finding.click();
    expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-label'))).toMatch(/spindle at 180°/);
    const described = await page.evaluate(
      () => document.getElementById(document.activeElement?.getAttribute('aria-describedby') ?? '')?.textContent,
    );
    expect(described).toContain('Not read yet.');
    await expectAccessible(page, 'sheet with its check');
    await context.close();
  });

  it('keeps both texts when two devices wrote into one field, and lets the person pick', async () => {
    const first = await visitor(browser, inspector);
    const second = await visitor(browser, inspector);
    const title = /Nose of main spindle S1/;
    await openSheet(first.page, title);
    await openSheet(second.page, title);
    const type = async (page: Page, text: string) => {
      await readingFields(page).nth(2).focus();
      await page.keyboard.type(text, { delay: 80 });
      await page.keyboard.press('Enter');
    };
    await type(first.page, '1.25');
    await allOnServer(first.page);
    await type(second.page, '1.75');
    await expect.poll(() => second.page.getByText('1 reading needs a decision').isVisible()).toBe(true);
    expect((await values(second.page))[2]).toBe('1.75');
    await second.page.getByRole('button', { name: /Keep 1.25 of the server/ }).click();
    await expect.poll(async () => (await values(second.page))[2]).toBe('1.25');
    await allOnServer(second.page);
    await first.context.close();
    await second.context.close();
  });

  it('goes on without a session, and sends when somebody has signed in again', async () => {
    const { page, context } = await visitor(browser, inspector);
    await openSheet(page, /Z1 motion parallel to the axis of main spindle S1, in ZX/);
    const cookies = await context.cookies();
    await context.clearCookies();
    const field = readingFields(page).nth(3);
    await field.focus();
    await page.keyboard.type('-0.75', { delay: 80 });
    await page.keyboard.press('Enter');
    await expect.poll(() => page.getByText('You are signed out').isVisible()).toBe(true);
    expect(await field.inputValue()).toBe('-0.75');
    await context.addCookies(cookies);
    await page.getByRole('button', { name: 'Send now' }).click();
    await allOnServer(page);
    await page.reload();
    await expect.poll(() => readingFields(page).nth(3).inputValue()).toBe('-0.75');
    await context.close();
  });
});
