import { groupNotInPlan } from '@/lib/reporting/group-not-in-plan';
import type { ReportModel } from '@/lib/reporting/report-model';

/** Tests of the codes that the plan does not have: each reason once, the titles in columns below it. */
export function NotInPlanList({ entries }: { entries: ReportModel['notInPlan'] }) {
  return (
    <dl className="grid gap-3">
      {groupNotInPlan(entries).map(({ reason, titles }) => (
        <div key={reason}>
          <dt className="font-semibold">
            {reason} ({titles.length})
          </dt>
          <dd>
            <ul className={`text-sm leading-6 ${titles.length > 3 ? 'sm:columns-2 sm:gap-x-8 print:columns-2' : ''}`}>
              {titles.map((title) => (
                <li key={title} className="break-inside-avoid">
                  {title}
                </li>
              ))}
            </ul>
          </dd>
        </div>
      ))}
    </dl>
  );
}
