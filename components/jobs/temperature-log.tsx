'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { NumberText } from '@/components/ui/inputs';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { api } from '@/lib/http/api-client';
import { temperatureForm } from '@/lib/schemas/job';

export interface LoggedTemperature {
  id: string;
  /** `10 Mar 12:10`, in the organisation's zone. */
  time: string;
  air: string | null;
  machine: string | null;
}

/** Air and machine over the days of the job, as read. */
export function TemperatureLog(props: { jobId: string; temperatures: LoggedTemperature[]; mayAdd: boolean }) {
  const { jobId, temperatures, mayAdd } = props;
  const [open, setOpen] = useState(false);
  return (
    <section aria-labelledby="temperatures">
      <h2 id="temperatures" className="font-semibold">
        Temperatures
      </h2>
      {temperatures.length === 0 ? (
        <p className="text-ink2">None noted yet.</p>
      ) : (
        <Table caption="Temperatures of the job" className="text-[15px]">
          <TableHead>
            <HeadCell>when</HeadCell>
            <HeadCell figure>air, °C</HeadCell>
            <HeadCell figure>machine, °C</HeadCell>
          </TableHead>
          <tbody>
            {temperatures.map((row) => (
              <Row key={row.id}>
                <RowHead className="py-1.5 font-normal">{row.time}</RowHead>
                <DataCell figure className="py-1.5">
                  {row.air ?? '–'}
                </DataCell>
                <DataCell figure className="py-1.5">
                  {row.machine ?? '–'}
                </DataCell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
      {mayAdd && (
        <button type="button" className="min-h-12 font-medium text-blue underline" onClick={() => setOpen(true)}>
          Note temperatures now
        </button>
      )}
      {open && <TemperatureDialog jobId={jobId} onClose={() => setOpen(false)} />}
    </section>
  );
}

function TemperatureDialog({ jobId, onClose }: { jobId: string; onClose: () => void }) {
  const router = useRouter();
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: temperatureForm,
    defaultValues: { measuredAt: '', air: '', machine: '' },
    prepare: (values) => ({ ...values, measuredAt: new Date().toISOString() }),
    send: (values, idempotencyKey) =>
      api(`/api/jobs/${jobId}/temperatures`, { method: 'POST', body: values, idempotencyKey }),
    onDone: () => {
      router.refresh();
      onClose();
    },
  });
  return (
    <Dialog open onOpenChange={(stays) => !stays && onClose()} title="Temperatures now">
      <form onSubmit={submit} noValidate className="grid gap-4 sm:grid-cols-2">
        <Field label="Air, °C" error={errorAt('air')} hint="Near the machine, out of the sun">
          <NumberText {...form.register('air')} />
        </Field>
        <Field label="Machine, °C" error={errorAt('machine')} hint="On the bed or the headstock">
          <NumberText {...form.register('machine')} />
        </Field>
        <div className="grid gap-4 sm:col-span-2">
          <FormProblem problem={problem} />
          <div className="flex flex-wrap justify-end gap-3">
            <Button onClick={onClose}>Not now</Button>
            <Button type="submit" variant="strong" disabled={sending}>
              Note them
            </Button>
          </div>
        </div>
      </form>
    </Dialog>
  );
}
