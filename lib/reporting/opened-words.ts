import type { ReportModel } from './report-model';

/** `T2 removed and refitted, after the collision · S1 untouched`; null where nothing is said of any component. */
export function openedWords(components: ReportModel['machine']['components']): string | null {
  const said = components.flatMap(({ id, condition }) => (condition ? [`${id} ${condition}`] : []));
  return said.length > 0 ? said.join(' · ') : null;
}
