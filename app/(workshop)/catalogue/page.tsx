import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { ProvenanceLine } from '@/components/catalogue/tolerance-table';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';
import { catalogue } from '@/lib/planning/catalogue';
import { toleranceLines } from '@/lib/planning/tolerance-words';
import { provenanceWords } from '@/lib/reporting/record-words';
import { DIRECTION_WORDS } from '@/lib/reporting/words';

export const metadata: Metadata = { title: 'Catalogue' };

export default async function CataloguePage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'catalogue.read')) notFound();
  return (
    <>
      <PageTitle note="Every test that a plan can be made of, in working order">Catalogue</PageTitle>
      {catalogue().map((code) => (
        <section key={code.slug} aria-labelledby={code.slug}>
          <SectionTitle id={code.slug}>{code.title}</SectionTitle>
          <p className="max-w-prose">{code.subject}</p>
          <ProvenanceLine provenance={code.source} />
          <div className="mt-2">
            <Table caption={`Tests of ${code.title}`}>
              <TableHead>
                <HeadCell>No.</HeadCell>
                <HeadCell>Test</HeadCell>
                <HeadCell figure>Tolerance, mm</HeadCell>
                <HeadCell>How it may lie</HeadCell>
                <HeadCell>Where the tolerance comes from</HeadCell>
              </TableHead>
              <tbody>
                {code.tests.map((test) => (
                  <Row key={test.id}>
                    <DataCell className="whitespace-nowrap font-mono text-[15px]">{test.id}</DataCell>
                    <RowHead>
                      <Link
                        href={`/catalogue/${code.slug}/${test.id}`}
                        className="inline-flex min-h-9 items-center text-blue underline"
                      >
                        {test.title}
                      </Link>
                    </RowHead>
                    <DataCell figure className="whitespace-nowrap">
                      {test.tolerance ? spread(toleranceLines(test.tolerance).map((line) => line.toleranceMm)) : 'none'}
                    </DataCell>
                    <DataCell>{DIRECTION_WORDS[test.direction]}</DataCell>
                    <DataCell>{test.tolerance && provenanceWords[test.tolerance.provenance.kind]}</DataCell>
                  </Row>
                ))}
              </tbody>
            </Table>
          </div>
        </section>
      ))}
    </>
  );
}

/** `0.005 to 0.012`: the first and the last line of the table. */
function spread(figures: string[]): string {
  const [first, last] = [figures[0], figures.at(-1)];
  return first === last ? (first ?? '') : `${first} to ${last}`;
}
