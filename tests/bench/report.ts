import { existsSync } from 'node:fs';
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { RenderPool } from '@/lib/queue/render-pool';
import { renderReportPdf } from '@/templates/report/render';
import { manyBlocks, sampleReportModel, summaryRow } from '../helpers/sample-report-model';
import type { BenchLine } from './bench-line';
import { warmChromium, withChromium } from './report-chromium';
import { ours } from './report-ours';
import { pdfkitFonts, withPdfkit } from './report-pdfkit';
import { samplePages } from './report-sample';

const ROUNDS = 15;
const PAGES = 30;

/** Drawing of reports: against pdfkit and a browser doing the same, growth with pages, the web server's loop, memory. */
export async function bench(): Promise<BenchLine[]> {
  return [await eventLoop(), ...(await speed()), await growth(), await wholeReport(), await memory()];
}

async function milliseconds(work: () => Promise<unknown>): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

function median(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN;
}

const ms = (value: number) => `${value.toFixed(1)} ms`;

async function speed(): Promise<BenchLine[]> {
  const samples = samplePages(PAGES);
  const fonts = await pdfkitFonts();
  const browser = existsSync('/usr/bin/chromium') ? await warmChromium() : null;
  const times = { ours: [] as number[], pdfkit: [] as number[], chromium: [] as number[] };
  for (let round = -3; round < ROUNDS; round += 1) {
    const one = {
      ours: await milliseconds(() => ours(samples)),
      pdfkit: await milliseconds(() => withPdfkit(samples, fonts)),
      chromium: browser ? await milliseconds(() => withChromium(browser, samples)) : Number.NaN,
    };
    if (round < 0) continue;
    for (const name of ['ours', 'pdfkit', 'chromium'] as const) times[name].push(one[name]);
  }
  await browser?.close();
  const own = median(times.ours);
  const against = (name: 'pdfkit' | 'chromium', bar: number): BenchLine => {
    const other = median(times[name]);
    const measured = Number.isFinite(other);
    return {
      name: `30 pages, 30 tables of 20 rows, 30 plots of 200 points, warm, against ${name}`,
      ours: ms(own),
      reference: measured ? ms(other) : 'not on this machine',
      ratio: measured ? (own / other).toFixed(2) : '–',
      bar: `≤ ${bar}`,
      meets: measured ? own / other <= bar : null,
    };
  };
  return [against('pdfkit', 2), against('chromium', 0.3)];
}

async function growth(): Promise<BenchLine> {
  const [few, many] = [samplePages(PAGES), samplePages(2 * PAGES)];
  const times: [number[], number[]] = [[], []];
  for (let round = 0; round < ROUNDS; round += 1) {
    times[0].push(await milliseconds(() => ours(few)));
    times[1].push(await milliseconds(() => ours(many)));
  }
  const [thirty, sixty] = [median(times[0]), median(times[1])];
  return {
    name: '60 pages against 30 pages',
    ours: ms(sixty),
    reference: ms(thirty),
    ratio: (sixty / thirty).toFixed(2),
    bar: '≤ 2.2',
    meets: sixty / thirty <= 2.2,
  };
}

/** A report as it is issued: 40 tests with sketch, plots, readings, limit rule. No reference draws the same. */
async function wholeReport(): Promise<BenchLine> {
  const model = longModel(40);
  const times: number[] = [];
  for (let round = 0; round < ROUNDS; round += 1) times.push(await milliseconds(() => renderReportPdf(model)));
  return {
    name: 'whole report of 40 tests, warm',
    ours: ms(median(times)),
    reference: '–',
    ratio: '–',
    bar: '–',
    meets: null,
  };
}

function longModel(tests: number) {
  const blocks = manyBlocks(tests);
  return sampleReportModel({ blocks, summary: blocks.map(summaryRow) });
}

/**
 * The longest time for which this process, standing for the web server, answered nothing while reports were made in the warm one.
 * Windows with and without reports by turns: on a busy machine the loop waits for the processor too, and that is not the report's.
 */
async function eventLoop(): Promise<BenchLine> {
  const pool = new RenderPool();
  const model = longModel(40);
  await pool.render({ report: model, photos: {} });
  const stops: { idle: number[]; busy: number[] } = { idle: [], busy: [] };
  for (let window = 0; window < 5; window += 1) {
    stops.busy.push(await longestStop(() => pool.render({ report: model, photos: {} }).then(() => pool.render(model))));
    stops.idle.push(await longestStop(() => new Promise((resolve) => setTimeout(resolve, 500))));
  }
  await pool.close();
  const longest = median(stops.busy);
  return {
    name: 'longest stop of the event loop while 2 reports of 40 tests are made, middle of 5 windows',
    ours: ms(longest),
    reference: `${ms(median(stops.idle))} without reports`,
    ratio: '–',
    bar: '≤ 25 ms',
    meets: longest <= 25,
  };
}

async function longestStop(work: () => Promise<unknown>): Promise<number> {
  let longest = 0;
  let last = performance.now();
  const watch = setInterval(() => {
    const now = performance.now();
    longest = Math.max(longest, now - last - 1);
    last = now;
  }, 1);
  await work();
  clearInterval(watch);
  return longest;
}

async function memory(): Promise<BenchLine> {
  setFlagsFromString('--expose-gc');
  const collect = runInNewContext('gc') as () => void;
  const samples = samplePages(PAGES);
  const heapAfter = async (renders: number) => {
    for (let i = 0; i < renders; i += 1) await ours(samples);
    // What a finaliser lets go is collected in a later pass only.
    for (let pass = 0; pass < 5; pass += 1) {
      collect();
      await new Promise((resolve) => setTimeout(resolve, 20));
    }
    return process.memoryUsage().heapUsed;
  };
  const early = await heapAfter(40);
  const late = await heapAfter(160);
  const mb = (bytes: number) => `${(bytes / 1024 / 1024).toFixed(1)} MB`;
  return {
    name: 'heap after 200 renders against after 40',
    ours: mb(late),
    reference: mb(early),
    ratio: (late / early).toFixed(3),
    bar: '≤ 1.05',
    meets: late / early <= 1.05,
  };
}
