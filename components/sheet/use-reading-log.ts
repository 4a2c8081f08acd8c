'use client';

import { useEffect, useState } from 'react';
import { api } from '@/lib/http/api-client';
import { type DeviceStore, deviceStore } from './device-store';
import { ReadingLog } from './reading-log';

const logs = new Map<string, ReadingLog>();

const nowhere: DeviceStore = { load: async () => [], write: async () => {} };

/** `14:05` in the organisation's zone. */
export const clockTime = (timeZone: string) => (at: Date) =>
  new Intl.DateTimeFormat('en-GB', { timeZone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' }).format(at);

/**
 * The log of the person at this device: one for all sheets, so that what waits from the sheet before is sent from this one. It sends
 * while a page that shows it is open.
 */
export function useReadingLog(account: { accountId: string; timeZone: string; readAt: string }): ReadingLog {
  const { accountId, timeZone, readAt } = account;
  const [log] = useState(() => {
    const known = logs.get(accountId);
    if (known) return known;
    const clock = clockTime(timeZone);
    const onDevice = typeof window !== 'undefined';
    const made = new ReadingLog(
      { store: onDevice ? deviceStore(accountId) : nowhere, send: api, clockTime: clock },
      clock(new Date(readAt)),
    );
    if (onDevice) logs.set(accountId, made);
    return made;
  });
  useEffect(() => {
    let stop = () => {};
    let gone = false;
    void log.load().then(() => {
      if (!gone) stop = log.start();
    });
    return () => {
      gone = true;
      stop();
    };
  }, [log]);
  return log;
}
