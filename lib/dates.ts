import { formatDay } from '@/lib/reporting/format-time';

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** A day as people say it: `2026-03-14` → `14 Mar 2026`. It is a day, so no time zone can move it. */
export function dayWords(day: string): string {
  const [year, month, date] = day.split('-');
  return `${Number(date)} ${months[Number(month) - 1]} ${year}`;
}

/** The day of a moment in the organisation's time zone, as people say it. */
export const dayIn = (moment: Date, timeZone: string): string => dayWords(formatDay(moment, timeZone));

/** Today in the organisation's time zone: `2026-03-14`. */
export const todayIn = (timeZone: string): string => formatDay(new Date(), timeZone);

/** The day so many days later. */
export function daysLater(day: string, days: number): string {
  const moment = new Date(`${day}T00:00:00Z`);
  moment.setUTCDate(moment.getUTCDate() + days);
  return moment.toISOString().slice(0, 10);
}
