const [major, minor] = process.versions.node.split('.').map(Number);

/** Ends with one sentence on a Node that lacks what these scripts use. */
export function requireNode() {
  if (major > 20 || (major === 20 && minor >= 11)) return;
  process.stderr.write(`Witnessmark needs Node 20.11 or later; this is ${process.versions.node}.\n`);
  process.exit(1);
}
