'use client';

import { Select } from '@/components/ui/inputs';
import { type LeftOutReason, leftOutReasons } from '@/lib/schemas/job';

/** One reason for a whole group of which nothing is taken. */
export function ReasonForAll({ group, onChoose }: { group: string; onChoose: (reason: LeftOutReason) => void }) {
  return (
    <div className="ml-auto flex items-center gap-3 py-1">
      <span aria-hidden="true" className="whitespace-nowrap">
        None of these because
      </span>
      <Select
        aria-label={`${group}: none of these because`}
        defaultValue=""
        onChange={(event) => onChoose(event.target.value as LeftOutReason)}
      >
        <option value="" disabled>
          Choose one reason for all
        </option>
        {Object.entries(leftOutReasons).map(([value, words]) => (
          <option key={value} value={value}>
            {words}
          </option>
        ))}
      </Select>
    </div>
  );
}
