import { dayWords } from '@/lib/dates';
import { type CalibrationState, calibrationWords } from '@/lib/schemas/calibration-state';

const inks: Record<CalibrationState, string> = {
  'in-date': 'text-blue',
  'due-soon': 'text-brass',
  overdue: 'text-oxide',
  'no-certificate': 'text-oxide',
};

/** In date, due soon, overdue: the word says it; the colour only helps. */
export function CalibrationWord({ state, dueOn }: { state: CalibrationState; dueOn: string | null }) {
  const edge = state === 'overdue' ? 'last valid day was' : 'last valid day';
  return (
    <span>
      <span className={`font-semibold ${inks[state]}`}>{calibrationWords[state]}</span>
      {dueOn && (
        <span className="block text-sm text-ink2">
          {edge} {dayWords(dueOn)}
        </span>
      )}
    </span>
  );
}
