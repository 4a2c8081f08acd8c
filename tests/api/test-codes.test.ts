import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getPlan } from '@/app/api/jobs/[id]/plan/route';
import { POST as postJob } from '@/app/api/jobs/route';
import { PATCH as changeOrganisation, GET as getOrganisation } from '@/app/api/organisation/route';
import { findJob } from '@/db/queries/jobs';
import { newestEditions } from '@/lib/planning/newest-editions';
import { codes } from '@/standards/registry';
import { ifMatch } from '@/tests/helpers/call-route';
import { Workshop } from './workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await Workshop.open();
});
afterAll(() => workshop?.close());

const geometric = { code: 'ISO 13041-1', edition: '2020' };
const all = newestEditions(codes()).map(({ code, edition }) => ({ code, edition }));
let number = 0;

function open(chosen?: object) {
  const machine = workshop.machines.get('LK32-0O81-B')!;
  number += 1;
  return workshop.call(postJob, {
    body: {
      machineId: machine.id,
      customerId: machine.customerId,
      reference: `T-${number}`,
      purpose: 'periodic',
      startsOn: '2026-11-02',
      ...(chosen ? { codes: chosen } : {}),
    },
  });
}

const codesOf = async (jobId: string) => {
  const { body } = await workshop.call(getPlan, { params: { id: jobId } });
  const found = body.proposals.map(
    ({ definition }: { definition: typeof geometric }) => `${definition.code}:${definition.edition}`,
  );
  return [...new Set(found)].sort();
};

/** What the job keeps; a code of another kind of machine gives its plan nothing. */
const keptCodes = async (jobId: string) => (await workshop.as('inspector', (trx) => findJob(trx, jobId)))?.codes;

describe('codes and editions of a job', () => {
  it('are the newest edition of each code of the catalogue while nobody has chosen', async () => {
    const { body } = await open();
    expect(await keptCodes(body.id)).toEqual(all);
    const proposed = await codesOf(body.id);
    expect(proposed).toContain('ISO 13041-1:2020');
    expect(proposed).not.toContain('ISO 13041-1:2004');
    expect(proposed).not.toContain('ISO 1708:1989');
  });

  it('decide what the plan is proposed from', async () => {
    const { body } = await open([geometric]);
    expect(await codesOf(body.id)).toEqual(['ISO 13041-1:2020']);
  });

  it('are refused where the catalogue does not have them, or where none is chosen', async () => {
    const unknown = await open([{ code: 'ISO 13041-1', edition: '1887' }]);
    expect([unknown.status, unknown.body.errors[0].pointer]).toEqual([422, '/codes']);
    expect((await open([])).status).toBe(422);
    const twice = await open([geometric, { ...geometric, edition: '2004' }]);
    expect([twice.status, twice.body.errors[0].pointer, twice.body.errors[0].detail]).toEqual([
      422,
      '/codes',
      'ISO 13041-1 is chosen twice, 2020 and 2004. Choose one edition of each code.',
    ]);
  });

  it('come from the organisation’s own choice; a job keeps what it began with', async () => {
    const before = await open();
    const { body: organisation } = await workshop.call(getOrganisation, { as: 'administrator' });
    const changed = await workshop.call(changeOrganisation, {
      as: 'administrator',
      body: { codes: [geometric] },
      headers: ifMatch(organisation.version),
    });
    expect(changed.body.codes).toEqual([geometric]);
    expect(await codesOf((await open()).body.id)).toEqual(['ISO 13041-1:2020']);
    expect(await keptCodes(before.body.id)).toEqual(all);
  });
});
