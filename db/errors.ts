import { DomainError } from '@/lib/errors';

interface PostgresError {
  code: string;
  constraint?: string;
  message: string;
}

const isPostgresError = (error: unknown): error is PostgresError =>
  typeof error === 'object' &&
  error !== null &&
  'code' in error &&
  typeof error.code === 'string' &&
  /^[0-9A-Z]{5}$/.test(error.code);

/** What a broken unique constraint means to the person who typed. */
const taken: Record<string, { pointer: string; detail: string }> = {
  machines_organisation_id_manufacturer_serial_number_key: {
    pointer: '/serialNumber',
    detail: 'This manufacturer’s machine with this serial number is registered already.',
  },
  customers_organisation_id_name_key: { pointer: '/name', detail: 'There is a customer of this name already.' },
  instruments_organisation_id_number_key: {
    pointer: '/number',
    detail: 'There is an instrument with this number already.',
  },
  jobs_organisation_id_reference_key: { pointer: '/reference', detail: 'There is a job with this reference already.' },
  memberships_organisation_id_account_id_key: { pointer: '/email', detail: 'This person is a member already.' },
  signatures_organisation_id_report_id_role_key: { pointer: '', detail: 'This report has been signed already.' },
};

/** PostgreSQL's codes as errors of the domain; everything that is not the reader's to mend stays as it is. */
export function asDomainError(error: unknown): unknown {
  if (!isPostgresError(error)) return error;
  switch (error.code) {
    case '23505': {
      const known = error.constraint ? taken[error.constraint] : undefined;
      return known ? new DomainError(409, 'Taken already', known.detail, [known]) : error;
    }
    case '42501':
      return new DomainError(403, 'Not allowed', 'This is not yours to change.');
    case 'WM001':
      return new DomainError(
        409,
        'Not possible now',
        'What has been issued or signed does not change. Open a new revision instead.',
      );
    case '40001':
    case '40P01':
      return new DomainError(
        503,
        'Please try again',
        'Somebody else saved at the same moment. Nothing was lost: send it again.',
      );
    case '57P01':
    case '57P03':
    case '53300':
      return new DomainError(
        503,
        'Please try again',
        'The database is not reachable at the moment. What you typed stays on this device.',
      );
    default:
      return error;
  }
}
