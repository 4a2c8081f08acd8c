import { randomBytes } from 'node:crypto';
import createKnex, { type Knex } from 'knex';
import { appDb, inScope } from '@/db/client';
import { addPeople, brackwaterMembers, type DemoOrganisation, quillmereMembers } from '@/db/seeds/demo-people';
import { addInstruments, addMachines, type RegisteredMachine } from '@/db/seeds/demo-register';
import type { Viewer } from '@/lib/auth/viewer';
import type { RouteHandler } from '@/lib/http/route';
import { newId } from '@/lib/id';
import type { PlanForm } from '@/lib/schemas/job';
import { makePlan, proposalsFor } from '@/lib/services/make-plan';
import { openJob } from '@/lib/services/open-job';
import { type Call, type CallAnswer, callRoute } from '@/tests/helpers/call-route';
import { type ClonedDatabase, cloneDatabase } from '@/tests/helpers/clone-database';

export type Member = 'inspector' | 'reviewer' | 'administrator' | 'customer' | 'stranger';

const emails: Record<Member, string> = {
  inspector: 'inspector@quillmere.example',
  reviewer: 'reviewer@quillmere.example',
  administrator: 'admin@quillmere.example',
  customer: 'customer@ashdown.example',
  stranger: 'admin@brackwater.example',
};

// biome-ignore lint/suspicious/noExplicitAny: a test looks into whatever was answered
type Answered = any;

export type Asked = Omit<Call, 'as'> & { as?: Member | null };

/** Two organisations with people, machines and instruments on a database of their own; nothing is planned or measured yet. */
export class Workshop {
  private constructor(
    readonly database: ClonedDatabase,
    readonly owner: Knex,
    readonly viewers: Map<Member, Viewer>,
    readonly machines: Map<string, RegisteredMachine>,
    readonly instruments: Map<string, string>,
  ) {}

  static async open(instruments: Parameters<typeof addInstruments>[1] = []): Promise<Workshop> {
    const database = await cloneDatabase();
    Object.assign(process.env, {
      APP_DATABASE_URL: database.appUrl,
      NEXTAUTH_SECRET: randomBytes(24).toString('hex'),
      NEXTAUTH_URL: 'http://localhost:3000',
    });
    const owner = createKnex({ client: 'pg', connection: database.ownerUrl, pool: { min: 0, max: 2 } });
    const found = async (name: string, code: string, rest: Pick<DemoOrganisation, 'customers' | 'members'>) => {
      const organisation: DemoOrganisation = {
        ...{
          organisationId: newId(),
          name,
          code,
          timeZone: 'Europe/Berlin',
          addressLines: ['Unit 4'],
          contact: 'office',
        },
        ...rest,
      };
      const { organisationId, timeZone } = organisation;
      await owner('organisations').insert({
        organisation_id: organisationId,
        name,
        code,
        time_zone: timeZone,
        address_lines: organisation.addressLines,
        contact: organisation.contact,
        set_up_done: true,
      });
      return { organisation, ...(await addPeople(organisation)) };
    };
    const ours = await found('Quillmere Machine Fitting', 'QMF', {
      customers: ['Ashdown Turned Parts', 'Millbrook Hydraulics', 'Tolland Medical Fittings'],
      members: quillmereMembers,
    });
    const theirs = await found('Brackwater Spindle Service', 'BSS', {
      customers: ['Ferrand & Daughter'],
      members: brackwaterMembers,
    });
    const people = new Map([...ours.viewers, ...theirs.viewers]);
    const viewers = new Map(Object.entries(emails).map(([who, email]) => [who as Member, people.get(email)!]));
    const scope = { organisationId: ours.organisation.organisationId, accountId: newId(), customerId: null };
    const register = await inScope(scope, async (trx) => ({
      machines: await addMachines(trx, ours.customers),
      instruments: await addInstruments(trx, instruments),
    }));
    return new Workshop(database, owner, viewers, register.machines, register.instruments);
  }

  viewer(who: Member): Viewer {
    return this.viewers.get(who)!;
  }

  /** One transaction of our organisation, as a request of that member would have it. */
  as<T>(who: Member, work: (trx: Knex.Transaction) => Promise<T>): Promise<T> {
    const { organisationId, accountId, customerId } = this.viewer(who);
    return inScope({ organisationId, accountId, customerId }, work);
  }

  /** Calls a route handler as it stands, as the inspector unless somebody else is named. */
  call(handler: RouteHandler, { as = 'inspector', ...asked }: Asked = {}): Promise<CallAnswer<Answered>> {
    return callRoute<Answered>(handler, { ...asked, ...(as === null ? {} : { as: this.viewer(as) }) });
  }

  /** A job of its own on a machine; the reference may come twice in no organisation. */
  openJob(serialNumber: string, reference = `QMF-${newId().slice(-8)}`): Promise<string> {
    const machine = this.machines.get(serialNumber)!;
    return this.as('inspector', (trx) =>
      openJob(trx, this.viewer('inspector'), {
        machineId: machine.id,
        customerId: machine.customerId,
        reference,
        purpose: 'periodic',
        scope: null,
        customerOrder: null,
        customerEngineer: null,
        decisionRule: 'simple',
        startsOn: '2026-03-10',
        endsOn: null,
        place: null,
        hours: null,
        people: [],
      }),
    );
  }

  /** A job with these tests only, planned; answers the first set of readings of each by the test's key. */
  async plannedJob(
    serialNumber: string,
    include: string[],
    contractTolerances: PlanForm['contractTolerances'] = [],
  ): Promise<{ jobId: string; sheets: Map<string, { sheetId: string; passId: string }> }> {
    const jobId = await this.openJob(serialNumber);
    const sheets = await this.as('inspector', async (trx) => {
      const { makeUp, codes } = await trx('jobs').where({ id: jobId }).first({ makeUp: 'make_up', codes: 'codes' });
      await makePlan(trx, jobId, {
        include,
        exclusions: proposalsFor({ makeUp, codes })
          .filter(({ key }) => !include.includes(key))
          .map(({ key }) => ({ key, reason: 'not-agreed' as const, text: null })),
        contractTolerances,
      });
      return trx('sheets')
        .join('passes', 'passes.sheet_id', 'sheets.id')
        .where({ 'sheets.job_id': jobId })
        .select({ key: 'sheets.key', sheetId: 'sheets.id', passId: 'passes.id' });
    });
    return { jobId, sheets: new Map(sheets.map(({ key, ...ids }) => [key, ids])) };
  }

  async close(): Promise<void> {
    if (globalThis.witnessmarkPool) await appDb().destroy();
    globalThis.witnessmarkPool = undefined;
    await this.owner.destroy();
    await this.database.drop();
  }
}
