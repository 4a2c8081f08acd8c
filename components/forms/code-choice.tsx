'use client';

import { FieldErrorLine } from '@/components/ui/field';
import { Checkbox } from '@/components/ui/inputs';
import { sameCode, type TestCodeChoice } from '@/lib/schemas/test-codes';

export interface OfferedCode {
  code: string;
  edition: string;
  /** `ISO 13041-1:2020`. */
  title: string;
  subject: string;
}

/** Codes and editions, each with what it is about. Choosing an edition takes out the other one of the same code. */
export function CodeChoice(props: {
  offered: OfferedCode[];
  chosen: TestCodeChoice;
  onChoose: (chosen: TestCodeChoice) => void;
  hint?: string;
  error?: string;
}) {
  const { offered, chosen, onChoose, hint, error } = props;
  return (
    <fieldset>
      <legend className="font-medium">Test codes and editions</legend>
      {hint && <p className="text-sm text-ink2">{hint}</p>}
      {offered.map(({ code, edition, title, subject }) => {
        const mine = { code, edition };
        return (
          <Checkbox
            key={title}
            label={title}
            hint={subject}
            checked={chosen.some((one) => sameCode(one, mine))}
            onChange={(event) =>
              onChoose(
                event.target.checked
                  ? [...chosen.filter((one) => one.code !== code), mine]
                  : chosen.filter((one) => !sameCode(one, mine)),
              )
            }
          />
        );
      })}
      {error && <FieldErrorLine>{error}</FieldErrorLine>}
    </fieldset>
  );
}
