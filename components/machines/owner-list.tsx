import { dayWords } from '@/lib/dates';

/** Who owned it from when to when, and whether the reports of the years before went along. */
export function OwnerList(props: {
  owners: { customerName: string; fromDate: string; untilDate: string | null; seesHistory: boolean }[];
}) {
  if (props.owners.length === 0) return <p className="text-ink2">Not known yet.</p>;
  return (
    <ul className="grid gap-2 text-[15px]">
      {props.owners.map((owner) => (
        <li key={`${owner.customerName}${owner.fromDate}`}>
          {owner.customerName}
          <span className="block text-sm text-ink2">
            from {dayWords(owner.fromDate)}
            {owner.untilDate && ` until ${dayWords(owner.untilDate)}`}
            {owner.seesHistory ? ', with all reports' : ', without the reports of the years before'}
          </span>
        </li>
      ))}
    </ul>
  );
}
