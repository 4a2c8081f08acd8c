import { PlainError } from './plain-error.mjs';

/** Databases that every server has and that are not ours to fill. */
const servers = new Set(['', 'postgres', 'template1']);

/** From `DATABASE_URL`: the administrator's address, and the database to use, which need not be there yet. */
export function readDatabaseUrl(text) {
  const [, start, name] = /^(postgres(?:ql)?:\/\/[^/?]*)(?:\/([^?]*))?/.exec(text) ?? [];
  if (start === undefined) throw new PlainError('DATABASE_URL must begin with postgres:// or postgresql://.');
  const database = decodeURIComponent(name ?? '');
  return { adminUrl: text, database: servers.has(database) ? 'witnessmark' : database };
}
