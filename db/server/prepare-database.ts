import { z } from 'zod';
import { appRole, createRoles, ownerRole, urlFor } from './create-roles';
import { installQueue } from './install-queue';
import { migrate } from './migrate';

/** Reads its settings from the environment, so that no password stands in the list of processes. */
const settings = z
  .object({
    ADMIN_DATABASE_URL: z.string(),
    DATABASE_NAME: z.string().min(1),
    OWNER_PASSWORD: z.string().min(1),
    APP_PASSWORD: z.string().min(1),
  })
  .transform((values) => ({
    adminUrl: values.ADMIN_DATABASE_URL,
    database: values.DATABASE_NAME,
    ownerPassword: values.OWNER_PASSWORD,
    appPassword: values.APP_PASSWORD,
  }))
  .parse(process.env);

const ownerUrl = urlFor(settings.adminUrl, ownerRole, settings.ownerPassword, settings.database);
const appUrl = urlFor(settings.adminUrl, appRole, settings.appPassword, settings.database);

/** Failures that lie in the address given to us and not in the program; answered with exit code 3 and one sentence. */
const sentences: Record<string, string> = {
  ECONNREFUSED: 'The database server named by DATABASE_URL does not answer.',
  ENOTFOUND: 'The host named by DATABASE_URL is not known.',
  '28P01': 'The database server refuses the role and password of DATABASE_URL.',
  '28000': 'The database server refuses the role of DATABASE_URL.',
  '42501': 'The role of DATABASE_URL may not make roles or databases; give it CREATEROLE and CREATEDB.',
};

await createRoles(settings).catch((error: { code?: string }) => {
  const sentence = sentences[error.code ?? ''];
  if (!sentence) throw error;
  process.stderr.write(`${sentence}\n`);
  process.exit(3);
});
await installQueue(ownerUrl);
await migrate(ownerUrl);
process.stdout.write(`${JSON.stringify({ ownerUrl, appUrl })}\n`);
