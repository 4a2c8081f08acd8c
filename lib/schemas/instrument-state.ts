/** Judged on the day of measuring, not today; the due date is the last valid day. No certificate counts as overdue. */
export const isOverdue = (dueOn: string | null, measuredOn: string): boolean => dueOn === null || dueOn < measuredOn;
