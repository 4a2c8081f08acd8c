import type { Measurement } from './measurement';
import { measurementsOfForm } from './measurements-of-form';
import { measurementsOfMotion } from './measurements-of-motion';

/** Everything that an own test can measure. */
export const measurements: Measurement[] = [...measurementsOfForm, ...measurementsOfMotion];

export const findMeasurement = (id: string): Measurement | null => measurements.find((one) => one.id === id) ?? null;
