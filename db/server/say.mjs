const startedAt = Date.now();

/** One plain line with the seconds since the command began. */
export function say(text) {
  process.stdout.write(`${String(Math.round((Date.now() - startedAt) / 1000)).padStart(4)} s  ${text}\n`);
}
