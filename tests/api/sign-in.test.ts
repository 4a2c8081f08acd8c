import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { appDb, inScope } from '@/db/client';
import { authOptions } from '@/lib/auth/options';
import { addPerson, openTestWorkshop, type TestWorkshop, testPassword } from '@/tests/helpers/test-workshop';

type Authorize = (
  credentials: { email: string; password: string },
  request: { headers: Record<string, string> },
) => Promise<{ id: string; organisationId: string; sessionVersion: number } | null>;

let workshop: TestWorkshop;
let authorize: Authorize;
beforeAll(async () => {
  workshop = await openTestWorkshop();
  authorize = (authOptions().providers[0] as unknown as { options: { authorize: Authorize } }).options.authorize;
});
afterAll(() => workshop.close());

const attempt = (email: string, password: string, address = '192.0.2.1') =>
  authorize({ email, password }, { headers: { 'x-forwarded-for': address } });

describe('signing in', () => {
  it('answers who it is, whatever the case and the spaces of the address', async () => {
    const { inspector } = workshop.people;
    expect(await attempt(' Inspector@TARN.example ', testPassword)).toMatchObject({
      id: inspector.accountId,
      organisationId: inspector.organisationId,
      sessionVersion: 1,
    });
  });

  it('answers the same for a wrong password and an unknown address', async () => {
    expect(await attempt('reviewer@tarn.example', 'wrong')).toBeNull();
    expect(await attempt('nobody@tarn.example', 'wrong')).toBeNull();
  });

  it('does not let a disabled member in', async () => {
    const person = await addPerson(workshop.organisationId, 'gone@tarn.example', ['inspector'], null);
    await inScope(workshop.scope, (trx) =>
      trx('memberships').where({ id: person.memberId }).update({ disabled_at: trx.fn.now() }),
    );
    expect(await attempt('gone@tarn.example', testPassword)).toBeNull();
  });

  it('slows down after five failures, counted in the database, and lets in again when time has passed', async () => {
    const email = 'administrator@tarn.example';
    for (let index = 0; index < 5; index++) expect(await attempt(email, `wrong ${index}`)).toBeNull();
    await expect(attempt(email, testPassword)).rejects.toThrow(/^wait:\d+$/);
    await expect(attempt(email, testPassword, '192.0.2.9')).rejects.toThrow(/^wait:\d+$/);
    // The other accounts are not slowed down by it.
    expect(await attempt('customer@tarn.example', testPassword)).not.toBeNull();
    await letTimePass(`sign-in:${email}`, 21);
    expect(await attempt(email, testPassword)).not.toBeNull();
    expect(await attempt(email, testPassword)).not.toBeNull();
  });

  it('slows one address down that tries many accounts', async () => {
    const tries = Array.from({ length: 80 }, (_, index) => index);
    let refused = 0;
    for (const index of tries) await attempt(`n${index}@tarn.example`, '', '192.0.2.50').catch(() => refused++);
    expect(refused).toBeGreaterThan(0);
    expect(await attempt('customer@tarn.example', testPassword, '192.0.2.51')).not.toBeNull();
  });
});

/** Moves the bucket's last change into the past, as the owner: the application itself has no right to. */
async function letTimePass(bucket: string, seconds: number): Promise<void> {
  await expect(appDb()('throttles').select()).rejects.toMatchObject({ code: '42501' });
  const { default: createKnex } = await import('knex');
  const owner = createKnex({ client: 'pg', connection: workshop.ownerUrl });
  await owner('throttles')
    .where({ key: bucket })
    .update({ updated_at: owner.raw(`now() - make_interval(secs => ?)`, [seconds]) });
  await owner.destroy();
}
