import { codes, codeTitle } from '@/standards/registry';

/** The codes of the catalogue as a person chooses among them. */
export const offeredCodes = () =>
  codes().map(({ code, edition, subject }) => ({ code, edition, title: codeTitle(code, edition), subject }));
