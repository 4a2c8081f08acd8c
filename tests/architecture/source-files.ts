import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

export const root = path.resolve(import.meta.dirname, '../..');

export interface SourceImport {
  /** Path inside the project, or null for a package. */
  file: string | null;
  /** As it was written. */
  specifier: string;
  typesOnly: boolean;
}

export interface SourceFile {
  path: string;
  text: string;
  lines: number;
  imports: SourceImport[];
}

/** What installing, building and running leave behind; a fresh machine has no git to ask. */
const leftBehind =
  /^(node_modules|\.git|\.next|\.data|coverage)$|^\.next-|^\.data-|\.tsbuildinfo$|^next-env\.d\.ts$|\.tmp\.ts$/;

/** Every file of the project, as paths from its root. */
export const projectFiles = (folder = ''): string[] =>
  readdirSync(path.join(root, folder), { withFileTypes: true })
    .filter((entry) => !leftBehind.test(entry.name))
    .flatMap((entry) => {
      const file = folder ? `${folder}/${entry.name}` : entry.name;
      if (entry.isDirectory()) return projectFiles(file);
      return entry.isFile() ? [file] : [];
    });

const statement =
  /^[ \t]*(?:import|export)\s+(type\s)?\s*((?:[\w*\s,]|\{[^}]*\})*?)\s*(?:from\s*)?['"]([^'"\n]+)['"]|\bimport\(\s*['"]([^'"\n]+)['"]\s*\)/gm;

const isTypesOnly = (keyword: string | undefined, names: string): boolean => {
  if (keyword) return true;
  const listed = /^\{([^}]*)\}$/.exec(names.trim())?.[1];
  const parts = (listed ?? '').split(',').filter((part) => part.trim() !== '');
  return parts.length > 0 && parts.every((part) => part.trim().startsWith('type '));
};

function resolve(specifier: string, from: string): string | null {
  const target = specifier.startsWith('@/')
    ? specifier.slice(2)
    : specifier.startsWith('.')
      ? path.join(path.dirname(from), specifier)
      : null;
  if (target === null) return null;
  const found = ['', '.ts', '.tsx', '.mjs', '.d.mts', '.d.ts', '/index.ts'].find((end) => {
    const full = path.join(root, target + end);
    return existsSync(full) && statSync(full).isFile();
  });
  if (found === undefined) throw new Error(`${from} imports ${specifier}, which is not there`);
  return target + found;
}

export function readSource(file: string): SourceFile {
  const text = readFileSync(path.join(root, file), 'utf8');
  const imports = [...text.matchAll(statement)].map(([, keyword, names = '', specifier, dynamic]) => {
    const written = specifier ?? dynamic ?? '';
    return { specifier: written, file: resolve(written, file), typesOnly: isTypesOnly(keyword, names) };
  });
  return { path: file, text, lines: text.split('\n').length - 1, imports };
}

/** The program's own source: no tests, and nothing that a tool has made. */
export const sourceFiles = (): SourceFile[] =>
  projectFiles()
    .filter((file) => /\.(ts|tsx|mjs|mts)$/.test(file) && !file.startsWith('tests/') && file !== 'next-env.d.ts')
    .map(readSource);
