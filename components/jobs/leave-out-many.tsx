'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Select, TextInput } from '@/components/ui/inputs';
import { type LeftOutReason, leftOutReasons } from '@/lib/schemas/job';
import type { ProposedTest } from './plan-choices';

/** All tests of one component in one go: a turret that was not touched, an axis that is not agreed. */
export function LeaveOutMany(props: {
  tests: ProposedTest[];
  onLeaveOut: (keys: string[], reason: LeftOutReason, text: string) => void;
}) {
  const { tests, onLeaveOut } = props;
  const components = [...new Set(tests.flatMap((test) => test.components))].sort();
  const [component, setComponent] = useState('');
  const [reason, setReason] = useState<LeftOutReason | ''>('');
  const [text, setText] = useState('');
  const keys = tests.filter((test) => test.components.includes(component)).map((test) => test.key);
  return (
    <details className="border-y border-line">
      <summary className="flex min-h-12 items-center font-semibold text-blue">
        <span aria-hidden="true" className="mr-2">
          ▸
        </span>
        Take nothing of one component
      </summary>
      <div className="grid items-end gap-3 pb-4 sm:grid-cols-2 lg:grid-cols-[10rem_14rem_1fr_auto]">
        <Field label="Component">
          <Select value={component} onChange={(event) => setComponent(event.target.value)}>
            <option value="">Choose one</option>
            {components.map((one) => (
              <option key={one} value={one}>
                {one}
              </option>
            ))}
          </Select>
        </Field>
        <Field label="Because">
          <Select value={reason} onChange={(event) => setReason(event.target.value as LeftOutReason | '')}>
            <option value="">Choose a reason</option>
            {Object.entries(leftOutReasons).map(([value, words]) => (
              <option key={value} value={value}>
                {words}
              </option>
            ))}
          </Select>
        </Field>
        <Field label="In your words" optional>
          <TextInput value={text} maxLength={400} onChange={(event) => setText(event.target.value)} />
        </Field>
        <Button
          disabled={keys.length === 0 || reason === ''}
          onClick={() => reason !== '' && onLeaveOut(keys, reason, text)}
        >
          {keys.length > 0 ? `Take none of its ${keys.length}` : 'Take none of it'}
        </Button>
      </div>
    </details>
  );
}
