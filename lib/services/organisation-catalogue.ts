import type { Db } from '@/db/client';
import { ownOrganisation } from '@/db/queries/organisations';
import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import { holdingToleranceValues, type ToleranceValueRow } from '@/db/queries/tolerance-values';
import { type OrganisationValues, toleranceCellKey } from '@/lib/planning/organisation-values';
import { formatDay } from '@/lib/reporting/format-time';
import type { TestDefinition } from '@/standards/types';

/** What the organisation has put beside the catalogue: its word on single figures, and its own tests. */
export interface OrganisationCatalogue {
  values: OrganisationValues;
  ownDefinitions: TestDefinition[];
}

export async function organisationCatalogue(db: Db): Promise<OrganisationCatalogue> {
  const { timeZone } = await ownOrganisation(db);
  return {
    values: organisationValues(await holdingToleranceValues(db), timeZone),
    ownDefinitions: await currentOwnDefinitions(db),
  };
}

/** @param holding the newest row of each figure that holds; @param timeZone decides on which day it was confirmed */
export function organisationValues(holding: readonly ToleranceValueRow[], timeZone: string): OrganisationValues {
  return new Map(
    holding.flatMap((row) => {
      if (row.state === 'withdrawn' || row.figure === null) return [];
      const confirmation = {
        state: row.state,
        by: row.accountName,
        on: formatDay(row.recordedAt, timeZone),
        edition: row.ofEdition,
        clause: row.clause,
        secondBy: row.secondAccountName,
      };
      return [[toleranceCellKey(row.definition, row.cell), { toleranceUm: row.figure, confirmation }] as const];
    }),
  );
}
