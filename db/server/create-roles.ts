import pg from 'pg';

export type RoleSettings = {
  /** A role that may create roles; a superuser on the local cluster. */
  adminUrl: string;
  database: string;
  ownerPassword: string;
  appPassword: string;
};

export const ownerRole = 'witnessmark_owner';
export const appRole = 'witnessmark_app';

/** The same server and parameters, another role, password and database. Works for socket addresses without a host too. */
export function urlFor(adminUrl: string, role: string, password: string, database: string): string {
  const rest = adminUrl.replace(/^postgres(ql)?:\/\//, '');
  const query = rest.includes('?') ? rest.slice(rest.indexOf('?')) : '';
  const authority = rest.split(/[/?]/)[0] ?? '';
  const host = authority.slice(authority.lastIndexOf('@') + 1) || 'localhost';
  return `postgresql://${role}:${encodeURIComponent(password)}@${host}/${encodeURIComponent(database)}${query}`;
}

async function canSignIn(url: string): Promise<boolean> {
  const client = new pg.Client({ connectionString: url });
  try {
    await client.connect();
    return true;
  } catch (error) {
    // 28P01, 28000: wrong password or role not allowed; anything else (no such database yet) came after signing in.
    return !['28P01', '28000'].includes((error as { code?: string }).code ?? '');
  } finally {
    await client.end().catch(() => undefined);
  }
}

async function ensureRole(
  admin: pg.Client,
  settings: RoleSettings,
  role: string,
  password: string,
  attributes: string,
) {
  const { rowCount } = await admin.query('select from pg_roles where rolname = $1', [role]);
  const secret = pg.escapeLiteral(password);
  if (rowCount === 0) await admin.query(`create role ${role} login ${attributes} password ${secret}`);
  else if (!(await canSignIn(urlFor(settings.adminUrl, role, password, settings.database)))) {
    await admin.query(`alter role ${role} login password ${secret}`);
  }
}

/** Signs in as the administrator; through the server's own database while ours is still missing. */
async function connectAdmin({ adminUrl }: RoleSettings): Promise<pg.Client> {
  for (const url of [adminUrl, databaseUrl(adminUrl, 'postgres')]) {
    const admin = new pg.Client({ connectionString: url });
    try {
      await admin.connect();
      return admin;
    } catch (error) {
      await admin.end().catch(() => undefined);
      // 3D000: there is no such database yet.
      if ((error as { code?: string }).code !== '3D000') throw error;
    }
  }
  throw new Error('The server has neither the named database nor one called postgres.');
}

/**
 * Makes the owner role, the application's role and the database where they are missing. Safe to repeat, and safe
 * against a second installation doing the same on the same server (an advisory lock makes them wait for each other).
 */
export async function createRoles(settings: RoleSettings): Promise<void> {
  const admin = await connectAdmin(settings);
  try {
    await admin.query("select pg_advisory_lock(hashtext('witnessmark roles'))");
    const me = await admin.query<{ rolsuper: boolean; rolcreatedb: boolean }>(
      'select rolsuper, rolcreatedb from pg_roles where rolname = current_user',
    );
    const { rolsuper, rolcreatedb } = me.rows[0]!;
    const plain = 'nosuperuser nocreaterole noinherit';
    const createDb = rolsuper || rolcreatedb ? 'createdb' : 'nocreatedb';
    await ensureRole(admin, settings, ownerRole, settings.ownerPassword, `${createDb} nosuperuser nocreaterole`);
    await ensureRole(admin, settings, appRole, settings.appPassword, `nocreatedb ${plain}`);
    // Only a member of the owner role may give it a database; a superuser need not be one.
    if (!rolsuper) await admin.query(`grant ${ownerRole} to current_user`);
    await ensureDatabase(admin, settings.database);
  } finally {
    await admin.end();
  }
  await grantDatabase(settings);
}

async function ensureDatabase(admin: pg.Client, database: string): Promise<void> {
  const { rowCount } = await admin.query('select from pg_database where datname = $1', [database]);
  if (rowCount === 0) {
    const name = pg.escapeIdentifier(database);
    await admin.query(`create database ${name} owner ${ownerRole} encoding 'UTF8' template template0`);
  }
}

/** On a database somebody else made, the owner role needs the right to create in it; on our own this changes nothing. */
async function grantDatabase(settings: RoleSettings): Promise<void> {
  const admin = new pg.Client({ connectionString: databaseUrl(settings.adminUrl, settings.database) });
  await admin.connect();
  try {
    const name = pg.escapeIdentifier(settings.database);
    await admin.query(`grant create, connect, temporary on database ${name} to ${ownerRole}`);
    await admin.query(`grant connect on database ${name} to ${appRole}`);
    await admin.query(`grant all on schema public to ${ownerRole}`);
    await admin.query(`grant usage on schema public to ${appRole}`);
    await admin.query('revoke create on schema public from public');
  } finally {
    await admin.end();
  }
}

/** The administrator's address with another database. */
export function databaseUrl(adminUrl: string, database: string): string {
  const [, scheme, authority, query] = /^(postgres(?:ql)?:\/\/)([^/?]*)(?:\/[^?]*)?(\?.*)?$/.exec(adminUrl) ?? [];
  if (scheme === undefined) throw new Error('The database address must begin with postgres:// or postgresql://.');
  return `${scheme}${authority}/${encodeURIComponent(database)}${query ?? ''}`;
}
