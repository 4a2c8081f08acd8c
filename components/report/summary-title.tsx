import Link from 'next/link';
import type { SummaryRow } from '@/lib/reporting/report-model';
import { titleWithComponent } from '@/lib/reporting/title-with-component';

/** The test's name, as a link where it leads somewhere. */
export function SummaryTitle({ row, href }: { row: SummaryRow; href?: string }) {
  const title = titleWithComponent(row.title, row.component);
  if (!href) return title;
  return (
    <Link href={href} className="text-blue underline">
      {title}
    </Link>
  );
}
