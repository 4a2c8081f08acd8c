import type { Role } from '@/lib/auth/permissions';

/** The person who is signed in, in the organisation that was chosen. */
export interface Viewer {
  accountId: string;
  organisationId: string;
  membershipId: string;
  name: string;
  email: string;
  functionTitle: string | null;
  roles: Role[];
  /** Set for somebody from a customer; row-level security shows this customer's machines only. */
  customerId: string | null;
  organisationName: string;
  organisationCode: string;
  timeZone: string;
  setUpDone: boolean;
}
