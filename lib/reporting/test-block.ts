import { componentWords } from '@/lib/planning/component-words';
import { definitionOf } from '@/lib/planning/definition-of';
import { leftOutReasons } from '@/lib/schemas/job';
import { shownUnit, toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import { formatDecimal } from '@/lib/units/format';
import { cautionText } from '@/standards/cautions';
import type { PlannedTolerance, ShownIn, TestDefinition } from '@/standards/types';
import type { CellChangeText } from './corrected-readings';
import { passBlock } from './pass-block';
import type { PhotoBlock, TestBlock } from './report-model';
import type { StoredJob, StoredPhoto, StoredSheet } from './stored-job';
import { toleranceSource } from './tolerance-source';
import { DIRECTION_WORDS } from './words';

/** `0.015 mm over 300 mm, never below 0.005 mm`; in the unit in which the result is shown. */
export function toleranceWords(tolerance: PlannedTolerance | null, unit: ShownIn = 'mm'): string {
  if (unit === 'items') return 'every item in order';
  if (!tolerance) return 'no tolerance given: for information';
  const figure = (um: string) => withUnit(formatDecimal(toleranceShown(um, unit)), unit);
  const parts = [figure(tolerance.baseUm)];
  if (tolerance.perLength) {
    parts[0] += ` over ${formatDecimal(tolerance.perLength.baseLengthMm)} mm`;
    parts.push(`never below ${figure(tolerance.perLength.minimumUm)}`);
    if (tolerance.perLength.maximumUm) parts.push(`never above ${figure(tolerance.perLength.maximumUm)}`);
  }
  if (tolerance.local)
    parts.push(`and ${figure(tolerance.local.toleranceUm)} over any ${formatDecimal(tolerance.local.lengthMm)} mm`);
  for (const { label, toleranceUm } of tolerance.also ?? []) parts.push(`${label} ${figure(toleranceUm)}`);
  return parts.join(', ');
}

export const editionWords = (definition: { code: string; edition: string }): string =>
  definition.edition ? `${definition.code}:${definition.edition}` : definition.code;

export function testBlock(
  sheet: StoredSheet,
  stored: StoredJob,
  context: { timeZone: string; changes: CellChangeText[] },
): TestBlock {
  const definition = definitionOf(sheet.definition, sheet.ownDefinition);
  const used = new Set(sheet.passes.flatMap((pass) => pass.instruments.map((entry) => entry.instrumentId)));
  return {
    order: sheet.position,
    reference: `${definition.id} · ${editionWords(sheet.definition)}${definition.testNumber ? ` ${definition.testNumber}` : ''}`,
    title: sheet.title,
    component: sheet.component,
    componentWords: componentWords(sheet.component, stored.job.makeUp),
    sketch: definition.sketch,
    toleranceWords: toleranceWords(sheet.tolerance, sheetUnit(sheet, definition)),
    toleranceSource: toleranceSource(sheet.tolerance, sheet.definition.code),
    directionWords: sheet.direction === 'either' ? null : DIRECTION_WORDS[sheet.direction],
    judgedFigure: definition.judgedFigure,
    instruments: stored.instruments
      .filter((entry) => used.has(entry.id))
      .map((entry) => `${entry.number} ${entry.name}`),
    ...(sheet.ruleSet ? { ruleSet: sheet.ruleSet } : {}),
    cautions: definition.cautions.map((caution) => cautionText(caution)),
    passes: sheet.leftOutReason
      ? []
      : sheet.passes
          .filter((pass) => pass.result || pass.linkedTo || pass.takenAt)
          .map((pass) => passBlock(pass, { definition, ...context })),
    leftOut: sheet.leftOutReason ? { reason: leftOutReasons[sheet.leftOutReason], text: sheet.leftOutText } : null,
    remark: sheet.remark,
    ...(definition.layout.kind === 'check-list' ? { check: true as const } : {}),
    ...(sheet.photos.length > 0 ? { photos: sheet.photos.map((photo) => photoBlock(photo, definition)) } : {}),
  };
}

/** Unit of a sheet's results: that of the stored ones, else that of its definition. */
export function sheetUnit(sheet: StoredSheet, definition: TestDefinition): ShownIn {
  const stored = sheet.passes.findLast(({ result }) => result !== null)?.result;
  if (stored) return shownUnit(stored.outcome.displayed);
  return definition.layout.kind === 'check-list' ? 'items' : (definition.shownIn ?? 'mm');
}

function photoBlock(photo: StoredPhoto, { layout }: TestDefinition): PhotoBlock {
  const item = layout.kind === 'check-list' ? layout.items.find(({ id }) => id === photo.item) : undefined;
  const { fileId, sha256, widthPx, heightPx } = photo;
  return { fileId, sha256, widthPx, heightPx, words: [item?.question, photo.caption].filter(Boolean).join(' · ') };
}
