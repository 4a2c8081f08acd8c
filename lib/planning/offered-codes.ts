import { ownTests } from '@/standards/own-tests';
import { codes, codeTitle } from '@/standards/registry';

/** The codes of the catalogue as a person chooses among them; the organisation's own tests where it has any. */
export const offeredCodes = (hasOwnTests = false) =>
  [...codes(), ...(hasOwnTests ? [ownTests] : [])].map(({ code, edition, subject }) => ({
    code,
    edition,
    title: codeTitle(code, edition),
    subject,
  }));
