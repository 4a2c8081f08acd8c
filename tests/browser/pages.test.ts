import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectAccessible, goToSearch, launchBrowser, visitor, widths } from '@/tests/helpers/browser';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser?.close());

/** Addresses of one machine, job, sheet, report … of the demo scenario, found through the interface. */
async function addresses(page: Page): Promise<string[]> {
  const get = async (path: string) => (await page.request.get(path)).json();
  const jobs: { id: string; reference: string; machineId: string }[] = (await get('/api/jobs')).items;
  const job = (reference: string) => jobs.find((entry) => entry.reference === reference)!;
  const worked = job('QMF-2041');
  const { sheets } = await get(`/api/jobs/${worked.id}/plan`);
  const reports = await get(`/api/jobs/${worked.id}/reports`);
  const issued = await get(`/api/jobs/${job('QMF-2083').id}/reports`);
  const instruments = await get('/api/instruments');
  const customers = await get('/api/customers');
  const kinds = ['SP-2a', 'AX-5', 'AX-1b', 'AX-4', 'TU-3', 'SS-1', 'PO-B', 'WP-1'];
  return [
    '/',
    '/jobs',
    `/jobs/new?machine=${worked.machineId}`,
    `/jobs/${worked.id}`,
    `/jobs/${job('QMF-2088').id}`,
    `/jobs/${job('QMF-2088').id}/plan`,
    `/jobs/${job('QMF-2079').id}/check`,
    `/jobs/${job('QMF-2079').id}/report`,
    ...kinds.map(
      (kind) => `/jobs/${worked.id}/sheets/${sheets.find((sheet: { key: string }) => sheet.key.startsWith(kind)).id}`,
    ),
    `/reports/${reports.items[0].id}`,
    `/reports/${issued.items[0].id}`,
    `/reports/${issued.items[0].id}/sign-here`,
    `/reports/${reports.items[0].id}/answered`,
    '/machines',
    '/machines/new',
    `/machines/${worked.machineId}`,
    `/machines/${worked.machineId}/edit`,
    '/instruments',
    '/instruments/new',
    `/instruments/${instruments.items[0].id}`,
    '/customers',
    '/customers/new',
    `/customers/${customers.items[0].id}`,
    '/catalogue',
    '/catalogue?show=unconfirmed',
    '/catalogue/iso-13041-1-2020/SP-2b',
    '/catalogue/values',
    '/catalogue/glossary',
    '/catalogue/own/OWN-1',
    '/catalogue/methods',
    '/catalogue/methods/positioning',
    '/archive',
    '/archive?q=LK32',
  ];
}

/** Nothing is wider than the window, and whatever can be pressed is large enough to be hit. */
async function expectRoom(page: Page, what: string): Promise<void> {
  const found = await page.evaluate(() => {
    const small = [
      ...document.querySelectorAll<HTMLElement>('a[href], button, input:not([type=hidden]), select, textarea'),
    ]
      .filter((element) => element.offsetParent !== null && !element.closest('p, li, dd, td, th, label, figcaption'))
      .map((element) => ({ element, box: element.getBoundingClientRect() }))
      .filter(({ box }) => box.width > 1 && box.height > 1 && (box.width < 24 || box.height < 24))
      .map(
        ({ element, box }) => `${element.outerHTML.slice(0, 90)} ${Math.round(box.width)}×${Math.round(box.height)}`,
      );
    return { wide: document.documentElement.scrollWidth - window.innerWidth, small };
  });
  expect(found.wide, `${what} is wider than the window`).toBeLessThanOrEqual(0);
  expect(found.small, `${what}: too small to be hit`).toEqual([]);
}

describe('every page', () => {
  it.each(['light', 'dark'] as const)('is accessible, fits and throws nothing, %s', async (theme) => {
    const visit = await visitor(browser, 'reviewer@quillmere.example');
    const { page } = visit;
    for (const address of await addresses(page)) {
      for (const viewport of [widths.desk, widths.tablet]) {
        await page.setViewportSize(viewport);
        const answer = await page.goto(address);
        expect(answer?.status(), address).toBe(200);
        await page.evaluate((wanted) => document.documentElement.setAttribute('data-theme', wanted), theme);
        await expectRoom(page, `${address} at ${viewport.width}`);
      }
      await expectAccessible(page, `${address} ${theme}`);
    }
    expect(visit.faults).toEqual([]);
    await visit.context.close();
  });

  it('of the administrator and of the public side too', async () => {
    const visit = await visitor(browser, 'admin@quillmere.example');
    const pages = ['/', '/team', '/settings', '/catalogue', '/catalogue/iso-13041-1-2020/SP-2b', '/catalogue/values'];
    const own = ['/catalogue/own/OWN-1', '/catalogue/own/OWN-1/new-version', '/catalogue/own/new'];
    const composing = ['parallelism', 'positioning', 'function-check'].map(
      (measure) => `/catalogue/own/new?measure=${measure}`,
    );
    for (const address of [...pages, ...own, ...composing]) {
      await visit.page.goto(address);
      await expectRoom(visit.page, address);
      await expectAccessible(visit.page, address);
    }
    expect(visit.faults).toEqual([]);
    await visit.context.close();
    const nobody = await visitor(browser, null);
    const calculators = ['', '/parallelism', '/circular', '/conformity', '/uncertainty'].map(
      (method) => `/calculator${method}`,
    );
    for (const address of ['/sign-in', '/invitation/no-such-token', '/no-such-page', ...calculators]) {
      await nobody.page.goto(address);
      await expectRoom(nobody.page, address);
      await expectAccessible(nobody.page, address);
    }
    await nobody.page.goto('/jobs');
    expect(new URL(nobody.page.url()).pathname).toBe('/sign-in');
    await nobody.context.close();
  });
});

it('"/" leads to the search and "?" lists the keys', async () => {
  const { page, context } = await visitor(browser, 'inspector@quillmere.example');
  await page.goto('/machines');
  await goToSearch(page);
  await page.keyboard.type('?');
  expect(await page.getByRole('dialog').count()).toBe(0);
  await page.locator('main').click({ position: { x: 5, y: 5 } });
  await page.keyboard.press('?');
  await expect.poll(() => page.getByRole('dialog').isVisible()).toBe(true);
  await context.close();
});

it('a disabled member is refused at the next request', async () => {
  const admin = await visitor(browser, 'admin@quillmere.example');
  const reviewer = await visitor(browser, 'reviewer@quillmere.example');
  const members = (await (await admin.page.request.get('/api/members')).json()).items;
  const target = members.find((member: { email: string }) => member.email === 'reviewer@quillmere.example');
  const switchOff = async (disabled: boolean) => {
    const current = (await (await admin.page.request.get('/api/members')).json()).items.find(
      (member: { id: string }) => member.id === target.id,
    );
    return admin.page.request.patch(`/api/members/${target.id}`, {
      data: { disabled },
      headers: { 'if-match': `"${current.version}"` },
    });
  };
  expect((await reviewer.page.request.get('/api/jobs')).status()).toBe(200);
  expect((await switchOff(true)).ok()).toBe(true);
  expect((await reviewer.page.request.get('/api/jobs')).status()).toBe(401);
  expect((await switchOff(false)).ok()).toBe(true);
  await admin.context.close();
  await reviewer.context.close();
});
