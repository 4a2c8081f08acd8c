import type { Db } from '@/db/client';

export interface TestDuration {
  code: string;
  /** Definition id. */
  id: string;
  /** Sets of readings that it is the median of. */
  passes: number;
  minutes: number;
}

/** The newest sets of readings say how long a test takes today; older ones are not looked at. */
const NEWEST_PASSES = 1500;
/** A longer gap to the reading before was a break, or other work. */
const LONGEST_SET_UP_MINUTES = 60;

/**
 * How long each test took in the organisation's own past: the median over its sets of readings of the time from the first reading to the
 * last, and of the gap to the set before it on the same job and day as the time for setting up. Times are those of the devices.
 */
export async function testDurations(db: Db, timeZone: string): Promise<TestDuration[]> {
  const { rows } = await db.raw(
    `with newest as (
       select id, sheet_id from passes
       where taken_at is not null and linked_to is null order by taken_at desc limit ?
     ), spans as (
       select newest.sheet_id, min(o.device_time) as first, max(o.device_time) as last
       from newest join reading_operations o on o.pass_id = newest.id and o.outcome = 'applied'
       group by newest.id, newest.sheet_id
     ), timed as (
       select s.definition, spans.first, spans.last,
         extract(epoch from spans.first - lag(spans.last) over (
           partition by s.job_id, (spans.first at time zone ?)::date order by spans.first, spans.last
         )) / 60 as gap
       from spans join sheets s on s.id = spans.sheet_id
     )
     select definition->>'code' as code, definition->>'id' as id, count(*)::int as passes,
       percentile_cont(0.5) within group (order by
         extract(epoch from last - first) / 60 + case when gap > 0 and gap < ? then gap else 0 end
       )::float as minutes
     from timed group by 1, 2`,
    [NEWEST_PASSES, timeZone, LONGEST_SET_UP_MINUTES],
  );
  return rows;
}
