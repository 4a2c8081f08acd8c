'use client';

import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/inputs';
import { ComposerField } from './composer-field';
import { at, type ComposerForm } from './composer-form';

interface Item {
  question: string;
  value: { label: string; unit: string; lower: string; upper: string } | null;
}

/** Items of a function check, each a question so that “yes” is what should be; some with a figure. */
export function CheckItems({ api }: { api: ComposerForm }) {
  const items = (api.form.watch(at('layout.items')) ?? []) as unknown as Item[];
  const keep = (next: Item[]) => api.form.setValue(at('layout.items'), next as unknown as string);
  return (
    <div className="grid gap-4 sm:col-span-2">
      {items.map((item, index) => {
        const path = `layout.items.${index}`;
        return (
          <fieldset key={index} className="grid gap-3 border-l-4 border-line pl-4">
            <legend className="sr-only">Item {index + 1}</legend>
            <ComposerField
              api={api}
              path={`${path}.question`}
              label={`Item ${index + 1}`}
              hint="Asked so that “yes” is what should be"
            />
            <Checkbox
              label="With a figure"
              checked={item.value !== null}
              onChange={(event) =>
                keep(
                  items.map((one, at) =>
                    at === index
                      ? { ...one, value: event.target.checked ? { label: '', unit: '', lower: '', upper: '' } : null }
                      : one,
                  ),
                )
              }
            />
            {item.value && (
              <div className="grid gap-3 sm:grid-cols-4">
                <ComposerField api={api} path={`${path}.value.label`} label="Which figure" />
                <ComposerField api={api} path={`${path}.value.unit`} label="Unit" />
                <ComposerField api={api} path={`${path}.value.lower`} label="At least" optional figure />
                <ComposerField api={api} path={`${path}.value.upper`} label="At most" optional figure />
              </div>
            )}
            {items.length > 1 && (
              <div>
                <Button small variant="danger" onClick={() => keep(items.filter((_, at) => at !== index))}>
                  Take item {index + 1} out
                </Button>
              </div>
            )}
          </fieldset>
        );
      })}
      <div>
        <Button small onClick={() => keep([...items, { question: '', value: null }])}>
          Add an item
        </Button>
      </div>
    </div>
  );
}
