/** Programs of the newest PostgreSQL on this machine, or of the given major version. */
export function findPostgres(major?: string): { major: string; bin: string } | undefined;
