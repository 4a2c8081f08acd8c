import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { chromium } from 'playwright-core';
import { build } from 'vite';

const CHROMIUM = '/usr/bin/chromium';

/** The keystroke as the browser runs it: bundled, in Debian's Chromium, its CPU slowed down. Null without a Chromium. */
export async function timeInBrowser(slowdown: number, count: number, runs: number): Promise<number[] | null> {
  if (!existsSync(CHROMIUM)) return null;
  const code = await bundle();
  const browser = await chromium.launch({
    executablePath: CHROMIUM,
    args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking', '--disable-component-update'],
  });
  try {
    const page = await browser.newPage();
    await page.addScriptTag({ content: code });
    const session = await page.context().newCDPSession(page);
    await page.evaluate(`keystroke.timeKeystrokes(${count}, ${runs})`);
    await session.send('Emulation.setCPUThrottlingRate', { rate: slowdown });
    return await page.evaluate<number[]>(`keystroke.timeKeystrokes(${count}, ${runs})`);
  } finally {
    await browser.close();
  }
}

async function bundle(): Promise<string> {
  const root = fileURLToPath(new URL('../..', import.meta.url));
  const built = await build({
    root,
    configFile: false,
    logLevel: 'silent',
    publicDir: false,
    resolve: { alias: { '@': root.replace(/\/$/, '') } },
    build: {
      write: false,
      lib: { entry: fileURLToPath(new URL('./keystroke.ts', import.meta.url)), formats: ['iife'], name: 'keystroke' },
    },
  });
  const [first] = Array.isArray(built) ? built : [built];
  if (!first || !('output' in first)) throw new Error('nothing was bundled');
  return first.output[0].code;
}
