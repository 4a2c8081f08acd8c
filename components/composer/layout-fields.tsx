'use client';

import { FieldErrorLine } from '@/components/ui/field';
import { Checkbox } from '@/components/ui/inputs';
import type { Layout } from '@/standards/types';
import { CheckItems } from './check-items';
import { ComposerField } from './composer-field';
import { at, type ComposerForm } from './composer-form';
import { type LayoutFieldSpec, layoutFieldSpecs } from './layout-field-specs';
import { TickList } from './tick-list';

/** How the sheet is laid out: what is typed here is what the inspector finds as fields. */
export function LayoutFields({ api }: { api: ComposerForm }) {
  const kind = api.form.watch(at('layout.kind')) as unknown as Layout['kind'];
  const error = api.errorAt(at('layout'));
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      {layoutFieldSpecs[kind].map((spec) => (
        <OneField key={`${kind} ${spec.field}`} api={api} spec={spec} />
      ))}
      {kind === 'check-list' && <CheckItems api={api} />}
      {error && (
        <div className="sm:col-span-2">
          <FieldErrorLine>{error}</FieldErrorLine>
        </div>
      )}
    </div>
  );
}

function OneField({ api, spec }: { api: ComposerForm; spec: LayoutFieldSpec }) {
  const { field, label, hint, kind, optional, options } = spec;
  const path = `layout.${field}`;
  const common = { api, path, label, hint, optional };
  switch (kind) {
    case 'tick':
      return <Checkbox label={label} className="sm:col-span-2" {...api.form.register(at(path))} />;
    case 'ticks':
      return <TickList api={api} path={path} legend={label} options={options ?? []} />;
    case 'choice':
      return <ComposerField {...common} options={options} />;
    case 'count':
    case 'length':
      return <ComposerField {...common} figure />;
    case 'list':
      return <ComposerField {...common} mono className="sm:col-span-2" />;
    case 'names':
      return <ComposerField {...common} className="sm:col-span-2" />;
  }
}
