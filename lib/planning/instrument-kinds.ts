import { allDefinitions } from '@/standards/registry';

/** The kinds of instrument that the catalogue asks for, and further ones of the trade; proposals, not a closed list. */
export function instrumentKinds(): string[] {
  const asked = allDefinitions().flatMap(({ instruments }) => instruments);
  const further = [
    'precision level',
    'autocollimator',
    'laser interferometer',
    'circular-test gauge',
    'gauge block',
    'thermometer',
  ];
  return [...new Set([...asked, ...further])].sort();
}
