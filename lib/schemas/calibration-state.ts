import { daysLater } from '@/lib/dates';

export type CalibrationState = 'in-date' | 'due-soon' | 'overdue' | 'no-certificate';

export const calibrationWords: Record<CalibrationState, string> = {
  'in-date': 'in date',
  'due-soon': 'due soon',
  overdue: 'overdue',
  'no-certificate': 'no certificate',
};

const soonDays = 30;

/** The due date is the last valid day: on it the instrument is still in date. Due soon: within 30 days. */
export function calibrationState(dueOn: string | null, today: string): CalibrationState {
  if (dueOn === null) return 'no-certificate';
  if (dueOn < today) return 'overdue';
  return dueOn <= daysLater(today, soonDays) ? 'due-soon' : 'in-date';
}
