import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CalibrationForm } from '@/components/instruments/calibration-form';
import { CalibrationWord } from '@/components/instruments/calibration-word';
import { ChangeInstrument } from '@/components/instruments/change-instrument';
import { RetireButton } from '@/components/instruments/retire-button';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { inScope } from '@/db/client';
import { instrumentView } from '@/db/read-models/instrument-view';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { dayWords, todayIn } from '@/lib/dates';
import { instrumentKinds } from '@/lib/planning/instrument-kinds';
import { id } from '@/lib/schemas/common';

export const metadata: Metadata = { title: 'Instrument' };

export default async function InstrumentPage({ params }: { params: Promise<{ instrumentId: string }> }) {
  const viewer = await requireViewer();
  const { instrumentId } = await params;
  if (!can(viewer.roles, 'instrument.read') || !id.safeParse(instrumentId).success) notFound();
  const today = todayIn(viewer.timeZone);
  const instrument = await inScope(scopeOf(viewer), (trx) => instrumentView(trx, instrumentId, today));
  if (!instrument) notFound();
  const manages = can(viewer.roles, 'instrument.manage');
  const retired = instrument.retiredAt !== null;
  const { calibrations, number, name, kind, resolution, resolutionUnit, version } = instrument;
  return (
    <>
      <PageTitle
        note={`${kind}${resolution ? ` · resolution ${resolution} ${resolutionUnit}` : ''}`}
        action={
          manages && (
            <div className="flex gap-2">
              <ChangeInstrument
                instrument={{ id: instrument.id, number, name, kind, resolution, resolutionUnit, version }}
                kinds={instrumentKinds()}
              />
              <RetireButton id={instrument.id} version={version} retired={retired} />
            </div>
          )
        }
      >
        <span className="font-mono">{number}</span> {name}
      </PageTitle>
      <p>{retired ? 'Out of use.' : <CalibrationWord state={instrument.state} dueOn={instrument.dueOn} />}</p>
      <SectionTitle note="Newest first; reports keep naming the one that held on the day">Certificates</SectionTitle>
      {calibrations.length === 0 ? (
        <p className="text-ink2">None yet. Without one the instrument counts as overdue.</p>
      ) : (
        <Table caption="Certificates">
          <TableHead>
            <HeadCell>Certificate</HeadCell>
            <HeadCell>Laboratory</HeadCell>
            <HeadCell>Calibrated on</HeadCell>
            <HeadCell>Last valid day</HeadCell>
            <HeadCell figure>Expanded uncertainty</HeadCell>
            <HeadCell figure>k</HeadCell>
          </TableHead>
          <tbody>
            {calibrations.map((calibration) => (
              <Row key={calibration.id}>
                <RowHead className="font-mono">
                  {calibration.fileId ? (
                    <a href={`/api/files/${calibration.fileId}`} className="text-blue underline">
                      {calibration.certificate}
                    </a>
                  ) : (
                    calibration.certificate
                  )}
                </RowHead>
                <DataCell>{calibration.laboratory}</DataCell>
                <DataCell className="whitespace-nowrap">{dayWords(calibration.calibratedOn)}</DataCell>
                <DataCell className="whitespace-nowrap">{dayWords(calibration.dueOn)}</DataCell>
                <DataCell figure>
                  {calibration.expandedUncertainty &&
                    `${calibration.expandedUncertainty} ${calibration.uncertaintyUnit}`}
                </DataCell>
                <DataCell figure>{calibration.coverageFactor}</DataCell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
      {manages && !retired && (
        <>
          <SectionTitle>Add a certificate</SectionTitle>
          <CalibrationForm instrumentId={instrument.id} />
        </>
      )}
    </>
  );
}
