import { hash, verify } from '@node-rs/argon2';

/** argon2id; the parameters are the current recommendation for interactive sign-in (19 MiB, 2 passes). */
const options = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, options);

// Checked when the account is unknown, so that the answer takes as long as for a known one.
const nobody = '$argon2id$v=19$m=19456,t=2,p=1$c29tZXNhbHRzb21lc2FsdA$kXhK8tS5vN2T7gMFq8qHnY6g0b5YvJQm2c2cW6Jq3oU';

export async function passwordMatches(stored: string | null | undefined, password: string): Promise<boolean> {
  try {
    const matches = await verify(stored ?? nobody, password);
    return matches && stored !== null && stored !== undefined;
  } catch {
    return false;
  }
}
