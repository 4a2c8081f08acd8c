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

await createRoles(settings);
await installQueue(ownerUrl);
await migrate(ownerUrl);
process.stdout.write(`${JSON.stringify({ ownerUrl, appUrl })}\n`);
