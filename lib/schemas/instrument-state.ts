export interface CalibrationFacts {
  certificate: string;
  calibratedOn: string;
  /** Last valid day. */
  dueOn: string;
  expandedUncertainty: string | null;
  uncertaintyUnit: string | null;
  coverageFactor: string | null;
}

/** Judged on the day of measuring, not today; the due date is the last valid day. No certificate counts as overdue. */
export const isOverdue = (dueOn: string | null, measuredOn: string): boolean => dueOn === null || dueOn < measuredOn;

/** The certificate that held on a day: the newest one that had been made by then. A later certificate heals nothing. */
export const calibrationOn = (calibrations: CalibrationFacts[], measuredOn: string): CalibrationFacts | null =>
  calibrations
    .filter((calibration) => calibration.calibratedOn <= measuredOn)
    .sort((a, b) => (a.calibratedOn < b.calibratedOn ? 1 : -1))[0] ?? null;
