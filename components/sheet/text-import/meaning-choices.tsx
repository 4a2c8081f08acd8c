'use client';

import { Field } from '@/components/ui/field';
import { Radio, Select } from '@/components/ui/inputs';
import { directionWords, mappingOf } from '@/lib/sheet/text-import/import-text';
import type { DirectionBy, ImportChoices, Way } from '@/lib/sheet/text-import/types';
import type { TestDefinition } from '@/standards/types';

/** What cannot be seen in the columns: which way a line was taken, and whose positions hold. */
export function MeaningChoices(props: {
  definition: TestDefinition;
  text: string;
  choices: ImportChoices;
  onChange: (change: Partial<ImportChoices>) => void;
}) {
  const { definition, text, choices, onChange } = props;
  const mapping = mappingOf(definition.layout);
  if (!mapping) return null;
  const { ways, directionsBy, matchesPositions } = mapping;
  const isLong = choices.columns.some((role) => role === 'deviation' || role === 'radius');
  const wayWords = (by: DirectionBy): string => {
    if (by === 'column') return 'as its column says';
    if (by === 'travel') return `${ways?.first ?? ''} where the target rises from line to line`;
    return `all lines ${ways?.[by] ?? ''}`;
  };
  return (
    <div className="grid items-start gap-4 sm:grid-cols-2">
      {ways && isLong && (
        <fieldset className="grid gap-2">
          <legend className="mb-1 font-semibold">Direction of a line</legend>
          <Select
            aria-label="Direction of a line"
            value={choices.directionBy}
            onChange={(event) => onChange({ directionBy: event.target.value as DirectionBy })}
          >
            {directionsBy.map((by) => (
              <option key={by} value={by}>
                {wayWords(by)}
              </option>
            ))}
          </Select>
          {choices.directionBy === 'column' &&
            directionWords(text, choices).map((word) => (
              <Field key={word} label={`“${word}” means`}>
                <Select
                  value={choices.ways[word] ?? ''}
                  onChange={(event) => onChange({ ways: { ...choices.ways, [word]: event.target.value as Way } })}
                >
                  {!choices.ways[word] && <option value="">not said yet</option>}
                  <option value="first">{ways.first}</option>
                  <option value="second">{ways.second}</option>
                </Select>
              </Field>
            ))}
        </fieldset>
      )}
      {matchesPositions && (
        <fieldset>
          <legend className="mb-1 font-semibold">Positions</legend>
          <Radio
            name="text-import-positions"
            label="are those of the sheet"
            hint="A line at another position is not taken."
            checked={choices.positions === 'match'}
            onChange={() => onChange({ positions: 'match' })}
          />
          <Radio
            name="text-import-positions"
            label="take the place of the sheet's"
            hint="The sheet's positions and readings are emptied first."
            checked={choices.positions === 'replace'}
            onChange={() => onChange({ positions: 'replace' })}
          />
        </fieldset>
      )}
    </div>
  );
}
