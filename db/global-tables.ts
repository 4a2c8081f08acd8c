/**
 * Tables without row-level security: their rows must be found before the organisation is known. The application's role has no
 * privilege on them; it reaches them only through the named functions (security definer) that stand beside each.
 */
export const globalTables = [
  {
    name: 'accounts',
    reason: 'a person signs in before an organisation is chosen, and one account can be a member of several',
    functions: [
      'account_by_email',
      'account_session',
      'account_memberships',
      'account_create',
      'account_set_password',
      'account_end_sessions',
    ],
  },
  {
    name: 'access_tokens',
    reason: 'an invitation is opened by somebody who has no account yet; the token alone leads to the organisation',
    functions: ['access_token_create', 'access_token_find', 'access_token_use'],
  },
  {
    name: 'throttles',
    reason: 'wrong passwords are counted before anybody is signed in',
    functions: ['throttle_take', 'throttle_clear'],
  },
  {
    name: 'knex_migrations',
    reason: 'kept by the migration library, owner only',
    functions: [],
  },
  {
    name: 'knex_migrations_lock',
    reason: 'kept by the migration library, owner only',
    functions: [],
  },
] as const;
