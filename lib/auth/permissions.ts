export const roles = ['administrator', 'reviewer', 'inspector', 'customer'] as const;
export type Role = (typeof roles)[number];

/** Every action of the program, what it means, and who may do it. What is not listed is refused. */
export const permissions = {
  'organisation.change': { means: 'change letterhead and defaults', roles: ['administrator'] },
  'member.list': { means: 'see who is a member', roles: ['administrator', 'reviewer', 'inspector'] },
  'member.manage': { means: 'invite, disable and change members', roles: ['administrator'] },
  'customer.list': { means: 'see customers', roles: ['administrator', 'reviewer', 'inspector'] },
  'customer.manage': { means: 'add and change customers', roles: ['administrator', 'reviewer', 'inspector'] },
  'machine.read': { means: 'see machines', roles: ['administrator', 'reviewer', 'inspector', 'customer'] },
  'machine.manage': { means: 'register and change machines', roles: ['administrator', 'reviewer', 'inspector'] },
  'machine.transfer': { means: 'hand a machine on to another owner', roles: ['administrator', 'reviewer'] },
  'instrument.read': { means: 'see instruments', roles: ['administrator', 'reviewer', 'inspector'] },
  'instrument.manage': { means: 'add instruments and certificates', roles: ['administrator', 'reviewer', 'inspector'] },
  'instrument.override': {
    means: 'allow an instrument after its due date, with a reason',
    roles: ['administrator', 'reviewer'],
  },
  'catalogue.read': { means: 'see the catalogue', roles: ['administrator', 'reviewer', 'inspector', 'customer'] },
  'catalogue.confirm': { means: 'confirm or replace tolerances of the catalogue', roles: ['administrator'] },
  'catalogue.agree': {
    means: 'agree to a tolerance as the second person',
    roles: ['administrator', 'reviewer'],
  },
  'catalogue.compose': { means: 'compose own tests', roles: ['administrator'] },
  'job.read': { means: 'see jobs, plans and sheets', roles: ['administrator', 'reviewer', 'inspector'] },
  'job.manage': {
    means: 'open a job, make its plan, leave tests out',
    roles: ['administrator', 'reviewer', 'inspector'],
  },
  'sheet.measure': { means: 'enter readings', roles: ['inspector', 'reviewer'] },
  'report.read': { means: 'read reports', roles: ['administrator', 'reviewer', 'inspector', 'customer'] },
  'report.issue': { means: 'check a job and issue its report', roles: ['reviewer'] },
  'report.witness': { means: 'have a report signed on the own tablet', roles: ['inspector', 'reviewer'] },
  'report.sign': { means: 'accept or refuse a report for the customer', roles: ['customer'] },
  'archive.search': {
    means: 'look machines and reports up',
    roles: ['administrator', 'reviewer', 'inspector', 'customer'],
  },
} as const satisfies Record<string, { means: string; roles: readonly Role[] }>;

export type Action = keyof typeof permissions;

/** Fails closed: an unknown action or an empty list of roles is refused. */
export function can(held: readonly string[], action: Action): boolean {
  // Own entries only: every object answers to `toString`.
  const entry: { roles: readonly string[] } | null = Object.hasOwn(permissions, action) ? permissions[action] : null;
  return entry !== null && held.some((role) => entry.roles.includes(role));
}
