import { type Browser, chromium } from 'playwright-core';
import { FOOT, type SamplePage } from './report-sample';

const QUIET = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--no-first-run',
];

export function warmChromium(): Promise<Browser> {
  return chromium.launch({ executablePath: '/usr/bin/chromium', args: QUIET });
}

/** The comparison's pages as HTML, printed by a browser that is already running. */
export async function withChromium(browser: Browser, samples: readonly SamplePage[]): Promise<Buffer> {
  const page = await browser.newPage();
  try {
    await page.setContent(html(samples));
    return await page.pdf({ format: 'A4' });
  } finally {
    await page.close();
  }
}

function html(samples: readonly SamplePage[]): string {
  const cells = (tag: string, texts: readonly string[]) => texts.map((text) => `<${tag}>${text}</${tag}>`).join('');
  const pages = samples.map(({ title, columns, rows, points }, index) => {
    const table = `<table><tr>${cells('th', columns)}</tr>${rows.map((row) => `<tr>${cells('td', row)}</tr>`).join('')}</table>`;
    const line = points.map((p) => `${70 + Number(p.x) * 1.5},${150 - Number(p.y) * 12}`).join(' ');
    const grid = [-5, 0, 5, 10]
      .map((v) => `<path d="M70 ${150 - v * 12}H520" stroke="#e4dfd0"/><text x="40" y="${154 - v * 12}">${v}</text>`)
      .join('');
    const svg = `<svg width="600" height="240">${grid}<polyline points="${line}" fill="none" stroke="#14406e"/></svg>`;
    return `<section><h2>${title}</h2>${table}${svg}<footer>${FOOT.join(' ')} page ${index + 1} of ${samples.length}</footer></section>`;
  });
  return `<meta charset="utf-8"><style>section{break-after:page;font:11px "IBM Plex Mono",monospace}td,th{border-bottom:1px solid #e4dfd0;text-align:right;width:90px}</style>${pages.join('')}`;
}
