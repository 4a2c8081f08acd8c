import type { Db } from '@/db/client';
import type { OrganisationChange } from '@/lib/schemas/organisation';
import type { TestCodeChoice } from '@/lib/schemas/test-codes';

export interface Organisation {
  id: string;
  name: string;
  code: string;
  addressLines: string[];
  contact: string | null;
  timeZone: string;
  paper: 'A4' | 'Letter';
  setUpDone: boolean;
  /** What a new job is proposed with; null: the newest edition of every code of the catalogue. */
  codes: TestCodeChoice | null;
  /** Values of tolerances wait for a second person. */
  fourEyes: boolean;
  /** What a new job says about tolerances that nobody confirmed. */
  refuseUnconfirmed: boolean;
  version: number;
}

/** The organisation of the transaction; row-level security shows no other. */
export async function ownOrganisation(db: Db): Promise<Organisation> {
  const row = await db('organisations').first({
    id: 'organisation_id',
    name: 'name',
    code: 'code',
    addressLines: 'address_lines',
    contact: 'contact',
    timeZone: 'time_zone',
    paper: 'paper',
    setUpDone: 'set_up_done',
    codes: 'codes',
    fourEyes: 'four_eyes',
    refuseUnconfirmed: 'refuse_unconfirmed',
    version: 'version',
  });
  if (!row) throw new Error('The organisation of this transaction does not exist.');
  return row;
}

/** Answers false when somebody else changed it meanwhile. */
export async function updateOrganisation(db: Db, version: number, change: OrganisationChange): Promise<boolean> {
  const columns = {
    name: change.name,
    code: change.code,
    address_lines: change.addressLines,
    contact: change.contact,
    time_zone: change.timeZone,
    paper: change.paper,
    set_up_done: change.setUpDone,
    codes: change.codes && JSON.stringify(change.codes),
    four_eyes: change.fourEyes,
    refuse_unconfirmed: change.refuseUnconfirmed,
  };
  const given = Object.fromEntries(Object.entries(columns).filter(([, value]) => value !== undefined));
  return (
    (await db('organisations')
      .where({ version })
      .update({ ...given, version: version + 1 })) === 1
  );
}
