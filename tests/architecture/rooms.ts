/** Rooms of the project, and what each may import. The longest matching path wins; a room may always import itself. */
export interface Room {
  path: string;
  /** Rooms or single files whose code it may use. */
  uses: string[];
  /** Rooms of which it may use the types only. */
  types?: string[];
  /** Packages; `*` for any. */
  packages: RegExp;
}

const domain = [
  ...['lib/units', 'lib/evaluation/index.ts', 'lib/explaining', 'lib/sheet'],
  ...['lib/planning', 'lib/reporting', 'lib/schemas'],
];
const leaves = ['lib/errors.ts', 'lib/env.ts', 'lib/id.ts', 'lib/dates.ts', 'lib/version.ts', 'lib/time-zones.ts'];
const calculators = ['lib/evaluation', 'lib/conformity', 'lib/uncertainty', 'lib/correction'];
const none = /^$/;
const any = /./;

export const rooms: Room[] = [
  { path: 'lib/units', uses: [], packages: /^decimal\.js$/ },
  // Its one door gathers the neighbours' methods; they use its small helpers.
  ...calculators.map((path) => ({ path, uses: ['lib/units', ...calculators], packages: /^(decimal\.js|zod)$/ })),
  { path: 'standards', uses: ['lib/units'], types: ['lib/evaluation'], packages: none },
  {
    path: 'lib/sheet',
    uses: ['lib/units', 'lib/evaluation/index.ts', 'lib/conformity', 'standards'],
    types: ['lib/schemas'],
    packages: none,
  },
  {
    path: 'lib/planning',
    uses: ['lib/units', 'lib/evaluation/index.ts', 'lib/sheet', 'lib/schemas', 'standards'],
    packages: none,
  },
  {
    path: 'lib/reporting',
    uses: ['lib/units', 'lib/evaluation/index.ts', 'lib/sheet', 'lib/planning', 'lib/schemas', 'standards'],
    types: ['lib/explaining'],
    packages: none,
  },
  {
    path: 'lib/explaining',
    uses: ['lib/units', 'lib/evaluation/index.ts', 'lib/sheet', 'lib/planning', 'lib/reporting', 'standards'],
    packages: none,
  },
  { path: 'lib/schemas', uses: ['lib/units', 'lib/auth/permissions.ts', 'lib/dates.ts'], packages: /^zod$/ },
  { path: 'lib/services', uses: ['db', 'lib', 'standards', 'templates/email'], packages: /^(knex|zod|sharp|node:.*)$/ },
  { path: 'lib/auth', uses: ['db', ...leaves], packages: /^(next|next-auth|react|@node-rs\/argon2|node:crypto)(\/|$)/ },
  { path: 'lib/http', uses: ['db', 'lib/auth', 'lib/schemas', ...leaves], packages: /^(zod|knex|node:crypto)$/ },
  { path: 'lib/storage', uses: leaves, packages: /^(@aws-sdk\/client-s3|node:.*)$/ },
  { path: 'lib/mail', uses: leaves, packages: /^(nodemailer|node:.*)$/ },
  { path: 'lib/seal', uses: leaves, packages: any },
  {
    path: 'lib/queue',
    uses: [
      'db',
      'lib/services',
      'lib/storage',
      'lib/mail',
      'lib/seal',
      'lib/reporting',
      'lib/evaluation/index.ts',
      'templates',
      ...leaves,
    ],
    packages: /^(graphile-worker|pg|zod|node:.*)$/,
  },
  { path: 'lib', uses: ['lib/reporting/format-time.ts', 'package.json'], packages: /^(zod|uuid)$/ },
  {
    path: 'templates/report',
    uses: [
      'lib/reporting',
      'lib/units',
      'components/plots/drawing.ts',
      'components/plots/drawing-parts.ts',
      'components/plots/limit-rule-geometry.ts',
      'components/plots/number.ts',
      'components/plots/plot-geometry.ts',
      'components/plots/verdict-ink.ts',
      'components/plots/verdict-mark-geometry.ts',
      'components/sketches/sketch-geometry.ts',
    ],
    packages: /^(@react-pdf\/renderer|react|node:(fs\/promises|module|path|zlib))$/,
  },
  { path: 'templates/email', uses: ['lib/reporting'], packages: none },
  {
    path: 'components/ui',
    uses: ['components/plots', 'lib/reporting/words.ts', 'lib/theme.ts'],
    packages: /^(react|radix-ui|next)(\/|$)/,
  },
  { path: 'components/plots', uses: [...domain, 'standards'], packages: /^(react|d3-(scale|shape|array))$/ },
  { path: 'components/sketches', uses: ['components/plots', ...domain, 'standards'], packages: /^react$/ },
  {
    path: 'components',
    uses: [
      'components',
      ...domain,
      'standards',
      'lib/conformity',
      'lib/uncertainty',
      'lib/correction',
      'lib/auth/permissions.ts',
      'lib/auth/places.ts',
      'lib/auth/demo-accounts.ts',
      'lib/http/api-client.ts',
      'lib/http/next-link.ts',
      'lib/http/sign-in-client.ts',
      'lib/dates.ts',
      'lib/errors.ts',
      'lib/id.ts',
      'lib/theme.ts',
      'lib/time-zones.ts',
      'lib/version.ts',
    ],
    types: ['lib/auth/viewer.ts'],
    packages:
      /^(react|react-dom|next|radix-ui|sonner|zod|react-hook-form|@hookform\/resolvers|@tanstack\/react-query|idb-keyval)(\/|$)/,
  },
  {
    path: 'db/seeds',
    uses: ['db', 'lib', 'standards'],
    packages: /^knex$/,
  },
  { path: 'db/server', uses: ['db', 'knexfile.ts'], packages: any },
  {
    path: 'db',
    uses: [
      ...['lib/errors.ts', 'lib/env.ts', 'lib/id.ts', 'lib/dates.ts', 'lib/schemas', 'lib/units'],
      'lib/evaluation/rule-set.ts',
    ],
    types: ['lib/auth', 'lib/reporting', 'lib/sheet', 'lib/planning', 'lib/evaluation', 'standards'],
    packages: /^(knex|pg|node:crypto)$/,
  },
  { path: 'migrations', uses: ['db/tenant-table.ts'], packages: /^knex$/ },
  { path: 'app', uses: ['app', 'components', 'db', 'lib', 'standards', 'templates'], packages: any },
  { path: 'knexfile.ts', uses: ['lib/env.ts'], packages: any },
];

const inside = (file: string, place: string) => file === place || file.startsWith(`${place}/`);

export const roomOf = (file: string): Room | undefined =>
  rooms.filter((room) => inside(file, room.path)).sort((a, b) => b.path.length - a.path.length)[0];

/** Whether a room may import a file of the project. A subroom of `lib` or `components` is named by its own path. */
export function mayImport(room: Room, file: string, typesOnly: boolean): boolean {
  const own = roomOf(file);
  if (own?.path === room.path) return true;
  return [...room.uses, ...(typesOnly ? (room.types ?? []) : [])].some((place) => inside(file, place));
}
