import type { Db } from '@/db/client';
import type { MakeUp } from '@/lib/schemas/make-up';

/** Some of the organisation's machines, to show a sheet on; the newest first. */
export async function exampleMachines(db: Db): Promise<{ title: string; makeUp: MakeUp }[]> {
  const rows: { manufacturer: string; model: string; serialNumber: string; makeUp: MakeUp }[] = await db('machines')
    .orderBy('id', 'desc')
    .limit(12)
    .select({ manufacturer: 'manufacturer', model: 'model', serialNumber: 'serial_number', makeUp: 'make_up' });
  return rows.map(({ manufacturer, model, serialNumber, makeUp }) => ({
    title: `${manufacturer} ${model}, ${serialNumber}`,
    makeUp,
  }));
}
