/** ISO date and time in the organisation's zone, the zone named: `2026-03-10 12:10 Europe/Berlin`. */
export function formatTime(moment: Date, timeZone: string): string {
  return `${formatDay(moment, timeZone)} ${parts(moment, timeZone).clock}`;
}

/** The day in the organisation's zone: `2026-03-10`. */
export function formatDay(moment: Date, timeZone: string): string {
  return parts(moment, timeZone).day;
}

function parts(moment: Date, timeZone: string): { day: string; clock: string } {
  const found = new Map(
    new Intl.DateTimeFormat('en-GB', {
      timeZone,
      year: 'numeric',
      month: '2-digit',
      day: '2-digit',
      hour: '2-digit',
      minute: '2-digit',
      hourCycle: 'h23',
    })
      .formatToParts(moment)
      .map((part) => [part.type, part.value]),
  );
  const get = (type: string) => found.get(type as Intl.DateTimeFormatPartTypes) ?? '';
  return { day: `${get('year')}-${get('month')}-${get('day')}`, clock: `${get('hour')}:${get('minute')}` };
}
