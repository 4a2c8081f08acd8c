import type { Db } from '@/db/client';
import { own } from '@/db/queries/jobs';
import { newId } from '@/lib/id';
import { foldSerial } from '@/lib/schemas/serial-number';
import { type DemoMachine, demoMachines } from './demo-machines';

export interface DemoInstrument {
  number: string;
  name: string;
  kind: string;
  resolution: string | null;
  resolutionUnit: string | null;
  certificate: string;
  calibrated: string;
  due: string;
  uncertainty: string;
  uncertaintyUnit: string;
  /** Sent to the laboratory again in time. */
  keptUp: boolean;
}

/** The certificate given, one for each year before it, and, where it is kept up, those after it. */
function certificates({ calibrated, due, certificate, keptUp }: DemoInstrument): [string, string, string][] {
  const shifted = (day: string, years: number) => `${Number(day.slice(0, 4)) + years}${day.slice(4)}`;
  const found: [string, string, string][] = [[calibrated, due, certificate]];
  for (let year = 1; year <= 7; year++)
    found.push([shifted(calibrated, -year), shifted(due, -year), `${certificate}/${year}`]);
  const today = new Date().toISOString().slice(0, 10);
  for (let year = 1; keptUp && shifted(due, year - 1) < today; year++) {
    found.push([shifted(calibrated, year), shifted(due, year), `${certificate}-${year}`]);
  }
  return found;
}

export async function addInstruments(db: Db, instruments: DemoInstrument[]): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const instrument of instruments) {
    const id = newId();
    ids.set(instrument.number, id);
    await db('instruments').insert({
      organisation_id: own(db),
      id,
      number: instrument.number,
      name: instrument.name,
      kind: instrument.kind,
      resolution: instrument.resolution,
      resolution_unit: instrument.resolutionUnit,
    });
    for (const [calibrated, due, certificate] of certificates(instrument)) {
      await db('calibrations').insert({
        organisation_id: own(db),
        id: newId(),
        instrument_id: id,
        certificate,
        laboratory: 'Hartmoor Reference Laboratory',
        calibrated_on: calibrated,
        due_on: due,
        expanded_uncertainty: instrument.uncertainty,
        uncertainty_unit: instrument.uncertaintyUnit,
        coverage_factor: '2',
      });
    }
  }
  return ids;
}

export interface RegisteredMachine extends DemoMachine {
  id: string;
  customerId: string;
}

export async function addMachines(db: Db, customers: Map<string, string>): Promise<Map<string, RegisteredMachine>> {
  const registered = new Map<string, RegisteredMachine>();
  for (const machine of demoMachines) {
    const id = newId();
    const customerId = customers.get(machine.customer);
    if (!customerId) throw new Error(`no customer ${machine.customer}`);
    await db('machines').insert({
      organisation_id: own(db),
      id,
      manufacturer: machine.manufacturer,
      model: machine.model,
      serial_number: machine.serialNumber,
      serial_folded: foldSerial(machine.serialNumber),
      year: machine.year,
      control: machine.control,
      site: machine.site,
      kind: machine.makeUp.kind,
      make_up: JSON.stringify(machine.makeUp),
    });
    await db('machine_owners').insert({
      organisation_id: own(db),
      id: newId(),
      machine_id: id,
      customer_id: customerId,
      from_date: `${machine.year}-01-01`,
      sees_history: true,
    });
    registered.set(machine.serialNumber, { ...machine, id, customerId });
  }
  return registered;
}
