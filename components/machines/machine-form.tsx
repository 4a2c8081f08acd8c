'use client';

import { useRouter } from 'next/navigation';
import { FormProvider } from 'react-hook-form';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { SectionTitle } from '@/components/ui/page-title';
import { api } from '@/lib/http/api-client';
import { linkMakeUp } from '@/lib/schemas/linked-make-up';
import { machineFields } from '@/lib/schemas/machine';
import type { MakeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { toMakeUpInput } from './machine-input';
import { MakeUpFields } from './make-up-fields';
import { NameplateFields } from './nameplate-fields';
import { OwnerField } from './owner-field';
import { StartFrom } from './start-from';

export interface FormMachine {
  id: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  year: number | null;
  control: string | null;
  site: string | null;
  makeUp: MakeUp;
  version: number;
}

const blank = { manufacturer: '', model: '', serialNumber: '', year: null, control: '', site: '' };

/** Registers a machine, starting from one of the usual kinds; or changes one. `goOnTo` leads elsewhere than to the machine. */
export function MachineForm(props: {
  machine?: FormMachine;
  customers: { id: string; name: string }[];
  goOnTo?: (id: string) => Promise<string>;
}) {
  const { machine, customers, goOnTo } = props;
  const router = useRouter();
  const start = machine?.makeUp ?? startingMakeUps[0]?.makeUp;
  if (!start) throw new Error('There is no make-up to start from.');
  const { manufacturer, model, serialNumber, year, control, site } = machine ?? blank;
  const { form, submit, problem, sending } = useApiForm({
    schema: machineFields,
    defaultValues: {
      manufacturer,
      model,
      serialNumber,
      year: year === null ? '' : String(year),
      control: control ?? '',
      site: site ?? '',
      customerId: '',
      makeUp: toMakeUpInput(start),
    },
    prepare: (values) => ({ ...values, makeUp: linkMakeUp(values.makeUp) }),
    send: async ({ customerId, ...values }, idempotencyKey) => {
      const request = machine
        ? ({ method: 'PATCH', body: values, version: machine.version } as const)
        : ({ method: 'POST', body: { ...values, customerId }, idempotencyKey } as const);
      return (await api<{ id: string }>(machine ? `/api/machines/${machine.id}` : '/api/machines', request)).data;
    },
    onDone: async ({ id }) => {
      router.push(goOnTo ? await goOnTo(id) : `/machines/${id}`);
      router.refresh();
    },
  });
  const marked = Object.keys(form.formState.errors).length > 0 && form.formState.submitCount > 0;
  return (
    <FormProvider {...form}>
      <form onSubmit={submit} noValidate className="grid gap-6">
        <NameplateFields />
        {!machine && <OwnerField customers={customers} />}
        <div>
          <SectionTitle note="The plan of tests is made from it">Make-up</SectionTitle>
          <div className="grid gap-7">
            {!machine && <StartFrom initial={0} />}
            <MakeUpFields />
          </div>
        </div>
        <div className="grid gap-4">
          <FormProblem problem={problem} />
          {marked && (
            <Notice tone="oxide" title="Please look at the marked fields" live>
              Nothing was sent yet; everything you typed is still here.
            </Notice>
          )}
          <div>
            <Button type="submit" variant="strong" disabled={sending}>
              {sending ? 'Saving' : machine ? 'Save the machine' : 'Register the machine'}
            </Button>
          </div>
        </div>
      </form>
    </FormProvider>
  );
}
