import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';
import { expect, inject } from 'vitest';
import { demoPassword } from '@/lib/auth/demo-accounts';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

export const widths = { desk: { width: 1280, height: 900 }, tablet: { width: 768, height: 1024 } };

/** Debian's Chromium without its own calls home. */
export const launchBrowser = (): Promise<Browser> =>
  chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });

export interface Visitor {
  context: BrowserContext;
  page: Page;
  /** Errors that the page itself threw, and requests that the server answered with 5xx. */
  faults: string[];
}

/** Somebody who is signed in (or not, without an address), on a window of their own. */
export async function visitor(browser: Browser, email: string | null, viewport = widths.desk): Promise<Visitor> {
  const context = await browser.newContext({ viewport, baseURL: inject('baseUrl'), reducedMotion: 'reduce' });
  const page = await context.newPage();
  const faults: string[] = [];
  page.on('pageerror', (error) => faults.push(error.message));
  page.on('response', (response) => {
    // 503 is a plain answer of ours: a document that is still being drawn.
    if (response.status() >= 500 && response.status() !== 503) faults.push(`${response.status()} ${response.url()}`);
  });
  if (email) await signIn(page, email);
  return { context, page, faults };
}

export async function signIn(page: Page, email: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail', { exact: false }).first().fill(email);
  await page.getByLabel('Password', { exact: false }).first().fill(demoPassword);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** Presses "/" until the page listens: a key that comes before its script has been loaded is nobody's. */
export async function goToSearch(page: Page): Promise<void> {
  await expect
    .poll(async () => {
      await page.keyboard.press('/');
      return page.evaluate(() => document.activeElement?.id);
    })
    .toBe('search');
}

interface AxeViolation {
  id: string;
  impact: string | null;
  help: string;
  nodes: { html: string; failureSummary?: string }[];
}

/** axe finds nothing serious or critical on the page as it stands. */
export async function expectAccessible(page: Page, what: string): Promise<void> {
  await page.evaluate(axeSource);
  const violations = await page.evaluate(async () => {
    const axe = (
      globalThis as unknown as { axe: { run(context: Document, options: object): Promise<{ violations: unknown[] }> } }
    ).axe;
    return (await axe.run(document, { resultTypes: ['violations'] })).violations;
  });
  const serious = (violations as AxeViolation[]).filter(
    (entry) => entry.impact === 'serious' || entry.impact === 'critical',
  );
  expect(
    serious.map(
      (entry) =>
        `${what}: ${entry.id} (${entry.help}) ${entry.nodes.map((node) => node.html.slice(0, 160)).join(' | ')}`,
    ),
  ).toEqual([]);
}
