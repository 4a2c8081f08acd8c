import type { Metadata } from 'next';
import Link from 'next/link';
import { HomeLine, HomeSection, JobToMeasure, MachineLine } from '@/components/jobs/home-sections';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { type HomeView, homeView } from '@/db/read-models/home';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { dayIn, dayWords, todayIn } from '@/lib/dates';

export const metadata: Metadata = { title: 'Waiting for you' };

export default async function HomePage() {
  const viewer = await requireViewer();
  const home = await inScope(scopeOf(viewer), (trx) => homeView(trx, viewer, todayIn(viewer.timeZone)));
  const waiting = Object.values(home).reduce((sum, list) => sum + list.length, 0);
  return (
    <div className="max-w-4xl">
      <PageTitle note={waiting > 0 ? `${waiting} ${waiting === 1 ? 'thing' : 'things'}` : undefined}>
        Waiting for you
      </PageTitle>
      {waiting === 0 ? (
        <NothingWaits staff={can(viewer.roles, 'job.read')} mayOpen={can(viewer.roles, 'job.manage')} />
      ) : (
        <Sections home={home} timeZone={viewer.timeZone} />
      )}
    </div>
  );
}

function NothingWaits({ staff, mayOpen }: { staff: boolean; mayOpen: boolean }) {
  return (
    <EmptyState
      title="Nothing waits for you"
      action={
        <div className="flex flex-wrap gap-3">
          {mayOpen && (
            <LinkButton variant="strong" href="/jobs/new">
              Open a job
            </LinkButton>
          )}
          <LinkButton href={staff ? '/jobs' : '/machines'}>{staff ? 'All jobs' : 'Your machines'}</LinkButton>
        </div>
      }
    >
      {staff
        ? 'Jobs to measure or to check, refused reports and instruments after their due date appear here. Everything else is in its room, and the search finds every machine by its serial number.'
        : 'Reports that wait for your signature appear here. The search finds every report of your machines by serial number.'}
    </EmptyState>
  );
}

function Sections({ home, timeZone }: { home: HomeView; timeZone: string }) {
  const nothingToMeasure = home.toMeasure.length === 0;
  return (
    <>
      {home.toSign.length > 0 && (
        <HomeSection title="Reports to sign">
          {home.toSign.map((report, index) => (
            <HomeLine
              key={report.reportId}
              action={
                <LinkButton variant={index === 0 ? 'strong' : 'plain'} href={`/reports/${report.reportId}`}>
                  Read and sign
                </LinkButton>
              }
            >
              <MachineLine
                href={`/reports/${report.reportId}`}
                {...report}
                reference={`${report.number} r${report.revision}`}
              />
              <p className="text-[15px] text-ink2">Issued {dayIn(report.issuedAt, timeZone)}</p>
            </HomeLine>
          ))}
        </HomeSection>
      )}
      {home.toMeasure.length > 0 && (
        <HomeSection title="To measure">
          {home.toMeasure.map((job, index) => (
            <JobToMeasure key={job.id} job={job} first={index === 0} />
          ))}
        </HomeSection>
      )}
      {home.toCheck.length > 0 && (
        <HomeSection title="To check">
          {home.toCheck.map((job, index) => (
            <HomeLine
              key={job.id}
              action={
                <LinkButton
                  variant={index === 0 && nothingToMeasure ? 'strong' : 'plain'}
                  href={`/jobs/${job.id}/check`}
                >
                  Check and report
                </LinkButton>
              }
            >
              <MachineLine href={`/jobs/${job.id}`} {...job} />
              <p className="text-[15px] text-ink2">
                {job.measured} of {job.planned} measured
              </p>
            </HomeLine>
          ))}
        </HomeSection>
      )}
      {home.refused.length > 0 && (
        <HomeSection title="Refused by the customer">
          {home.refused.map((report) => (
            <HomeLine
              key={report.reportId}
              action={<LinkButton href={`/reports/${report.reportId}`}>Open the report</LinkButton>}
            >
              <MachineLine href={`/jobs/${report.id}`} {...report} reference={`${report.number} r${report.revision}`} />
              {report.reason && <p className="text-[15px] text-oxide">{report.reason}</p>}
            </HomeLine>
          ))}
        </HomeSection>
      )}
      <Office home={home} timeZone={timeZone} />
    </>
  );
}

function Office({ home, timeZone }: { home: HomeView; timeZone: string }) {
  return (
    <>
      {home.overdueInstruments.length > 0 && (
        <HomeSection title="Instruments after their due date">
          {home.overdueInstruments.map((instrument) => (
            <HomeLine key={instrument.id}>
              <Link
                href={`/instruments/${instrument.id}`}
                className="inline-flex min-h-9 items-center font-medium text-blue underline"
              >
                {instrument.number}
              </Link>{' '}
              {instrument.name}{' '}
              <span className="text-brass">
                {instrument.dueOn ? `was due on ${dayWords(instrument.dueOn)}` : 'has no certificate'}
              </span>
            </HomeLine>
          ))}
        </HomeSection>
      )}
      {home.failedPdfs.length > 0 && (
        <HomeSection title="Reports whose PDF could not be made">
          {home.failedPdfs.map((report) => (
            <HomeLine key={report.reportId}>
              <Link
                href={`/reports/${report.reportId}`}
                className="inline-flex min-h-9 items-center font-mono text-blue underline"
              >
                {report.number} r{report.revision}
              </Link>
              {report.errorId && <span className="ml-3 font-mono text-sm text-ink2">{report.errorId}</span>}
            </HomeLine>
          ))}
        </HomeSection>
      )}
      {home.failedMails.length > 0 && (
        <HomeSection title="Mails that could not be sent">
          {home.failedMails.map((mail) => (
            <HomeLine key={mail.id}>
              {mail.recipient}: {mail.subject}{' '}
              <span className="text-sm text-ink2">{dayIn(mail.createdAt, timeZone)}</span>
            </HomeLine>
          ))}
        </HomeSection>
      )}
    </>
  );
}
