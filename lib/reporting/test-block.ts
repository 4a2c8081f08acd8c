import { componentWords } from '@/lib/planning/component-words';
import { definitionOf } from '@/lib/planning/definition-of';
import { leftOutReasons } from '@/lib/schemas/job';
import { convert } from '@/lib/units/convert';
import { formatDecimal } from '@/lib/units/format';
import { cautionText } from '@/standards/cautions';
import type { PlannedTolerance, TestDefinition } from '@/standards/types';
import type { CellChangeText } from './corrected-readings';
import { passBlock } from './pass-block';
import type { PhotoBlock, TestBlock } from './report-model';
import type { StoredJob, StoredPhoto, StoredSheet } from './stored-job';
import { toleranceSource } from './tolerance-source';
import { DIRECTION_WORDS } from './words';

const mm = (um: string) => formatDecimal(convert(um, 'µm', 'mm'));

/** `0.015 mm over 300 mm, never below 0.005 mm`. */
export function toleranceWords(tolerance: PlannedTolerance | null): string {
  if (!tolerance) return 'no tolerance given: for information';
  const parts = [`${mm(tolerance.baseUm)} mm`];
  if (tolerance.perLength) {
    parts[0] += ` over ${formatDecimal(tolerance.perLength.baseLengthMm)} mm`;
    parts.push(`never below ${mm(tolerance.perLength.minimumUm)} mm`);
    if (tolerance.perLength.maximumUm) parts.push(`never above ${mm(tolerance.perLength.maximumUm)} mm`);
  }
  if (tolerance.local)
    parts.push(`and ${mm(tolerance.local.toleranceUm)} mm over any ${formatDecimal(tolerance.local.lengthMm)} mm`);
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
    toleranceWords: toleranceWords(sheet.tolerance),
    toleranceSource: toleranceSource(sheet.tolerance, sheet.definition.code),
    directionWords: sheet.direction === 'either' ? null : DIRECTION_WORDS[sheet.direction],
    judgedFigure: definition.judgedFigure,
    instruments: stored.instruments
      .filter((entry) => used.has(entry.id))
      .map((entry) => `${entry.number} ${entry.name}`),
    cautions: definition.cautions.map((caution) => cautionText(caution)),
    passes: sheet.leftOutReason
      ? []
      : sheet.passes
          .filter((pass) => pass.result || pass.linkedTo || pass.takenAt)
          .map((pass) => passBlock(pass, { definition, ...context })),
    leftOut: sheet.leftOutReason ? { reason: leftOutReasons[sheet.leftOutReason], text: sheet.leftOutText } : null,
    remark: sheet.remark,
    ...(sheet.photos.length > 0 ? { photos: sheet.photos.map((photo) => photoBlock(photo, definition)) } : {}),
  };
}

function photoBlock(photo: StoredPhoto, { layout }: TestDefinition): PhotoBlock {
  const item = layout.kind === 'check-list' ? layout.items.find(({ id }) => id === photo.item) : undefined;
  const { fileId, sha256, widthPx, heightPx } = photo;
  return { fileId, sha256, widthPx, heightPx, words: [item?.question, photo.caption].filter(Boolean).join(' · ') };
}
