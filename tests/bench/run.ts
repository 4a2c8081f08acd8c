import type { BenchLine } from './bench-line';

/** `npm run bench` runs every part, `npm run bench -- report evaluation` only those named. One line a figure. */
const parts: Record<string, () => Promise<{ bench(): Promise<BenchLine[]> }>> = {
  evaluation: () => import('./evaluation'),
  report: () => import('./report'),
};

const wanted = process.argv.slice(2);
const unknown = wanted.filter((name) => !(name in parts));
if (unknown.length > 0) {
  console.error(`There is no part ${unknown.join(', ')}. Parts: ${Object.keys(parts).join(', ')}.`);
  process.exit(1);
}

for (const [name, load] of Object.entries(parts)) {
  if (wanted.length > 0 && !wanted.includes(name)) continue;
  const { bench } = await load();
  for (const line of await bench()) {
    const verdict = line.meets === null ? 'no bar' : line.meets ? 'meets' : 'falls short';
    console.log(
      `${name} | ${line.name} | ours ${line.ours} | reference ${line.reference} | ratio ${line.ratio} | bar ${line.bar} | ${verdict}`,
    );
  }
}
process.exit(0);
