import type { TestDefinition } from '../types';
import { backup, clamping, drivenTools, guideBush, orientation, switches, tailstock, turretIndexing } from './before';
import {
  chips,
  coolant,
  doors,
  dryRun,
  emergencyStop,
  lubrication,
  restored,
  synchronised,
} from './supplies-and-safety';

export const definitions: TestDefinition[] = [
  backup,
  switches,
  lubrication,
  coolant,
  chips,
  clamping,
  orientation,
  turretIndexing,
  tailstock,
  guideBush,
  drivenTools,
  synchronised,
  doors,
  emergencyStop,
  dryRun,
  restored,
];
