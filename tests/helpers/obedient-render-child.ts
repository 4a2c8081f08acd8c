import { existsSync, writeFileSync } from 'node:fs';

/** A drawing process that does what the model tells it, to try the pool around it. */
type Model = { act: 'answer' | 'hang' | 'crash' | 'fail'; once?: string; text?: string };

process.on('message', ({ id, model }: { id: number; model: Model }) => {
  // With `once`, the misbehaviour happens only while that file is missing.
  const tame = model.once !== undefined && existsSync(model.once);
  if (model.once && !tame) writeFileSync(model.once, '');
  const rssBytes = process.memoryUsage.rss();
  if (!tame && model.act === 'hang') return;
  if (!tame && model.act === 'crash') process.exit(9);
  if (!tame && model.act === 'fail') return process.send?.({ kind: 'failed', id, message: 'no such font', rssBytes });
  process.send?.({ kind: 'done', id, pdf: Buffer.from(`${process.pid} ${model.text ?? ''}`), rssBytes });
});
process.on('disconnect', () => process.exit(0));
process.send?.({ kind: 'ready' });
