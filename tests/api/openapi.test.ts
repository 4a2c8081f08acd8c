import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { GET } from '@/app/api/openapi.json/route';

interface Operation {
  summary: string;
  parameters: { name: string; in: string; required: boolean }[];
  requestBody?: { content: { 'application/json': { schema: object } } };
}
const root = path.resolve(import.meta.dirname, '../..');
const document: { openapi: string; paths: Record<string, Record<string, Operation>> } = await GET().json();

const files = readdirSync(path.join(root, 'app/api'), { recursive: true, encoding: 'utf8' })
  .map((file) => `app/api/${file.split(path.sep).join('/')}`)
  .filter((file) => file.endsWith('/route.ts') && !file.includes('[...nextauth]') && !file.includes('openapi.json'));

describe('GET /api/openapi.json', () => {
  it.each(files)('describes %s with exactly its methods', (file) => {
    const source = readFileSync(path.join(root, file), 'utf8');
    const exported = [
      ...source.matchAll(/export (?:const|async function|function) (GET|POST|PUT|PATCH|DELETE)\b/g),
    ].map((found) => found[1]!.toLowerCase());
    const address = `/${path.dirname(file).slice('app/'.length)}`.replace(/\[([^\]]+)\]/g, '{$1}');
    expect(Object.keys(document.paths[address] ?? {}).sort()).toEqual(exported.sort());
    expect(exported.length).toBeGreaterThan(0);
  });

  it('names every parameter of the path, the body that is parsed, and the headers that are wanted', () => {
    expect(document.openapi).toBe('3.1.0');
    for (const [address, operations] of Object.entries(document.paths)) {
      const inPath = [...address.matchAll(/\{([^}]+)\}/g)].map((found) => found[1]);
      for (const operation of Object.values(operations)) {
        expect(
          operation.parameters.filter((parameter) => parameter.in === 'path').map((parameter) => parameter.name),
        ).toEqual(inPath);
      }
    }
    const operations = document.paths['/api/sheets/{id}/operations']?.post;
    expect(JSON.stringify(operations?.requestBody)).toContain('baseVersion');
    expect(document.paths['/api/sheets/{id}']?.patch?.parameters).toContainEqual(
      expect.objectContaining({ name: 'If-Match', required: true }),
    );
    expect(JSON.stringify(document.paths['/api/evaluations']?.post?.requestBody)).toContain('minimum-zone');
  });
});
