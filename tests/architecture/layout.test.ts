import { expect, it } from 'vitest';
import { projectFiles, readSource, sourceFiles } from './source-files';

const all = projectFiles();
const files = sourceFiles();

it('the top level is the fixed one', () => {
  const topLevel = [...new Set(all.map((file) => file.split('/')[0]!))].sort();
  const rooms = ['app', 'components', 'db', 'lib', 'migrations', 'standards', 'templates', 'tests'];
  const texts = ['CHANGELOG.md', 'DEVELOPERS.md', 'LICENSE', 'README.md'];
  const project = ['knexfile.ts', 'next.config.mjs', 'package.json', 'tailwind.config.ts'];
  /** Demanded at the root by the tools themselves. */
  const tools = [
    '.ci',
    '.gitignore',
    '.npmrc',
    'biome.json',
    'package-lock.json',
    'postcss.config.mjs',
    'public',
    'tsconfig.json',
    'vitest.config.ts',
  ];
  expect(topLevel.filter((name) => ![...rooms, ...texts, ...project, ...tools].includes(name))).toEqual([]);
  for (const name of [...rooms, ...texts, ...project]) expect(topLevel).toContain(name);
});

it('names are in kebab case; folders of routes may hold a parameter or a group', () => {
  const name = /^[a-z0-9]+(?:-[a-z0-9]+)*(?:\.[a-z]+)*$/;
  // A folder of a route may be named as a file is: `openapi.json`, `values.csv`.
  const folder = /^(?:[a-z0-9]+(?:-[a-z0-9]+)*(?:\.(?:json|csv))?|\([a-z-]+\)|\[(?:\.\.\.)?[a-zA-Z]+\])$/;
  const odd = all
    .filter((file) => file.includes('/') && !/^(public|\.ci)\//.test(file))
    .filter((file) => {
      const parts = file.split('/');
      const last = parts.pop()!;
      const stem = file.startsWith('migrations/') ? last.replace(/^\d{14}_/, '').replaceAll('_', '-') : last;
      return !name.test(stem) || !parts.every((part) => folder.test(part));
    });
  expect(odd).toEqual([]);
});

it('exports have names; only what a tool asks for is a default export', () => {
  const askedFor =
    /^(app\/.*\/?(page|layout|loading|error|not-found|global-error)\.tsx|[^/]+\.(ts|mjs))$|^app\/api\/auth\//;
  expect(
    files.filter(({ path, text }) => /^export default\b/m.test(text) && !askedFor.test(path)).map((f) => f.path),
  ).toEqual([]);
});

it('there is no barrel file but the two doors', () => {
  const doors = ['lib/evaluation/index.ts', 'standards/registry.ts'];
  const handsOn = /^export\s+(?:type\s+)?(?:\*|\{[^}]*\})[^;]*\sfrom\s/m;
  const barrels = files.filter(
    ({ path, text }) =>
      !doors.includes(path) &&
      (/(^|\/)index\.(ts|tsx|mjs)$/.test(path) ||
        // A page may be another room's component as it stands.
        (handsOn.test(text) && !/^app\/.*\/(loading|error)\.tsx$/.test(path))),
  );
  expect(barrels.map(({ path }) => path)).toEqual([]);
});

it('no file is longer than 300 lines, data and migrations aside', () => {
  /** Longer with a reason. */
  const allowed: Record<string, string> = {};
  const isData = (path: string) => /^(standards|migrations)\/|\/data\//.test(path);
  const long = files.filter(({ path, lines }) => lines > 300 && !isData(path)).map(({ path }) => path);
  expect(long.filter((path) => !(path in allowed))).toEqual([]);
  expect(Object.keys(allowed).filter((path) => !long.includes(path))).toEqual([]);
});

it('every migration can be taken back', () => {
  const migrations = files.filter(({ path }) => path.startsWith('migrations/'));
  expect(migrations.length).toBeGreaterThan(3);
  for (const { path, text } of migrations) {
    expect(path).toMatch(/^migrations\/\d{14}_[a-z_]+\.ts$/);
    expect(text, path).toMatch(/^export async function up\(/m);
    expect(text, path).toMatch(/^export async function down\([^)]*\)[^{]*\{\s*\S/m);
  }
});

it('nothing is left open: no reminder, no skipped or lonely test', () => {
  const left = projectFiles()
    .filter((file) => /\.(ts|tsx|mjs)$/.test(file) && !file.startsWith('tests/architecture/'))
    .filter((file) => /\b(TODO|FIXME|XXX)\b|\b(it|test|describe)\.(skip|only|todo)\b/.test(readSource(file).text));
  expect(left).toEqual([]);
});
