import { expect, it } from 'vitest';
import { mayImport, roomOf, rooms } from './rooms';
import { type SourceFile, sourceFiles } from './source-files';

const files = sourceFiles();
const byPath = new Map(files.map((file) => [file.path, file]));

/** Settings of tools at the root are read by the tools alone. */
const isToolSetting = (path: string) => !path.includes('/') && path !== 'knexfile.ts';

it('reads the source', () => {
  expect(files.length).toBeGreaterThan(300);
  expect(files.flatMap((file) => file.imports).length).toBeGreaterThan(1000);
  for (const { path } of rooms.filter((room) => room.path !== 'lib/seal')) {
    expect(files.filter((file) => roomOf(file.path)?.path === path).length, path).toBeGreaterThan(0);
  }
});

it('every file stands in a room, and imports only what its room may', () => {
  const broken: string[] = [];
  for (const file of files.filter(({ path }) => !isToolSetting(path))) {
    const room = roomOf(file.path);
    if (!room) {
      broken.push(`${file.path} stands in no room`);
      continue;
    }
    for (const one of file.imports) {
      const allowed = one.file === null ? room.packages.test(one.specifier) : mayImport(room, one.file, one.typesOnly);
      if (!allowed) broken.push(`${file.path} (${room.path}) imports ${one.specifier}`);
    }
  }
  expect(broken).toEqual([]);
});

it('only requests, the worker and the demo scenario use the services', () => {
  const users = files
    .filter((file) => file.imports.some((one) => one.file?.startsWith('lib/services/')))
    .map((file) => file.path)
    .filter((path) => !/^(app|lib\/queue|db\/seeds|lib\/services)\//.test(path));
  expect(users).toEqual([]);
});

it('the program does not use its tests', () => {
  expect(files.filter((file) => file.imports.some((one) => one.file?.startsWith('tests/')))).toEqual([]);
});

/** The way of imports, types left out, from a file to something that it must never reach; null when there is none. */
function wayTo(start: SourceFile, forbidden: RegExp): string[] | null {
  const seen = new Set([start.path]);
  const ways: string[][] = [[start.path]];
  for (let way = ways.shift(); way; way = ways.shift()) {
    for (const one of byPath.get(way.at(-1)!)?.imports ?? []) {
      if (one.typesOnly) continue;
      const next = one.file ?? one.specifier;
      if (forbidden.test(next)) return [...way, next];
      if (one.file === null || seen.has(next)) continue;
      seen.add(next);
      ways.push([...way, next]);
    }
  }
  return null;
}

it('nothing that runs in the browser reaches the database, a secret or Node, by whatever way', () => {
  const server =
    /^(db\/|lib\/(env\.ts|services\/|storage\/|mail\/|seal\/|queue\/)|lib\/auth\/(session|options)|(pg|knex|server-only)$|node:)/;
  const inBrowser = files.filter(
    ({ path, text }) => path.startsWith('components/') || /^['"]use client['"]/.test(text),
  );
  expect(inBrowser.length).toBeGreaterThan(100);
  expect(inBrowser.flatMap((file) => [wayTo(file, server)].filter((way) => way !== null))).toEqual([]);
});

const pure = /^(lib\/(units|evaluation|conformity|uncertainty|correction|sheet|planning|reporting)|standards)\//;

it('what computes reaches no React, no Next.js, no database and no environment, by whatever way', () => {
  const outside =
    /^(db\/|app\/|lib\/(env\.ts|auth\/(?!permissions)|http\/)|(react|react-dom|next|next-auth|pg|knex)(\/|$)|node:)/;
  const found = files.filter(({ path }) => pure.test(path)).flatMap((file) => [wayTo(file, outside)]);
  expect(found.length).toBeGreaterThan(80);
  expect(found.filter((way) => way !== null)).toEqual([]);
});

it('what computes asks no clock, no chance and no environment', () => {
  const asks = /\bDate\.now\(|\bnew Date\(\)|\bMath\.random\(|\bprocess\.env\b|\bperformance\.now\(/;
  expect(files.filter(({ path, text }) => pure.test(path) && asks.test(text)).map(({ path }) => path)).toEqual([]);
});

it('no import goes round in a circle between rooms that compute', () => {
  const order = ['lib/units', 'lib/evaluation', 'standards', 'lib/sheet', 'lib/planning', 'lib/reporting'];
  const place = (path: string) => order.findIndex((room) => path.startsWith(`${room}/`));
  const backward = files.flatMap((file) =>
    file.imports
      .filter(
        (one) => !one.typesOnly && one.file !== null && place(file.path) >= 0 && place(one.file) > place(file.path),
      )
      .map((one) => `${file.path} → ${one.file}`),
  );
  expect(backward).toEqual([]);
});
