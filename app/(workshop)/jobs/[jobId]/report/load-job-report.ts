import { notFound, redirect } from 'next/navigation';
import { cache } from 'react';
import { inScope } from '@/db/client';
import { latestReport } from '@/db/queries/reports';
import { type ReportSource, reportSource } from '@/db/read-models/report-source';
import { listRevisions, type ReportRevision } from '@/db/read-models/report-view';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import { id as isId } from '@/lib/schemas/common';

/** A job as check and draft are made from it. Who may not see jobs is led to the report that is out, if there is one. */
export const loadJobReport = cache(
  async (jobId: string): Promise<{ viewer: Viewer; source: ReportSource; revisions: ReportRevision[] }> => {
    const viewer = await requireViewer();
    if (!isId.safeParse(jobId).success) notFound();
    if (!can(viewer.roles, 'job.read')) {
      const report = await inScope(scopeOf(viewer), (trx) => latestReport(trx, jobId));
      if (report) redirect(`/reports/${report.id}`);
      notFound();
    }
    const found = await inScope(scopeOf(viewer), async (trx) => ({
      source: await reportSource(trx, jobId),
      revisions: await listRevisions(trx, jobId),
    }));
    if (!found.source) notFound();
    return { viewer, source: found.source, revisions: found.revisions };
  },
);
