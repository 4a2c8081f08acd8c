import { simulatedReadings } from '@/db/seeds/simulated-readings';
import { planSheets } from '@/lib/planning/plan-sheets';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import type { Cells, SheetRules } from '@/lib/sheet/types';
import { currentDefinitions, findDefinition } from '@/standards/registry';
import { workedMachine } from '@/tests/planning/data/worked-machine';
import type { StoredPass } from './take-records';

/**
 * What the demo scenario may not have of a definition: passes well within, just out, by another decision rule, for
 * information, with readings missing, with units typed, with what cannot be read. Judged by the version that takes the records.
 */
export function variedPasses(): StoredPass[] {
  const planned = planSheets(workedMachine, currentDefinitions());
  const first = planned.filter(
    (sheet, index) => planned.findIndex(({ definition }) => definition.id === sheet.definition.id) === index,
  );
  return first.flatMap((sheet) => {
    const { id, code, edition, version } = sheet.definition;
    const definition = findDefinition(id, code, edition, version)!;
    const unit = definition.layout.kind === 'two-collars' ? ('mm' as const) : ('µm' as const);
    const readings = (share: number) =>
      Object.entries(
        simulatedReadings({
          definition,
          setUp: sheet.setUp,
          tolerance: sheet.tolerance,
          share,
          stepUm: 0.5,
          seed: `${sheet.key} ${share}`,
        }),
      );
    const cells = (share: number, type = (text: string): string => text): Cells => ({
      ...sheet.setUp,
      ...Object.fromEntries(readings(share).map(([pointer, text]) => [pointer, { text: type(text), unit }])),
    });
    const { tolerance, direction } = sheet;
    const rules: SheetRules = { definition: sheet.definition, tolerance, direction, decisionRule: 'simple' };
    const without = (from: Cells, count: number): Cells => {
      const left = readings(0.5).slice(-count);
      return Object.fromEntries(Object.entries(from).filter(([pointer]) => !left.some(([gone]) => gone === pointer)));
    };
    const [last] = readings(0.5).at(-1)!;
    const cases: [kind: string, rules: SheetRules, cells: Cells][] = [
      ['well within', rules, cells(0.3)],
      ['out', rules, cells(1.4)],
      ['guarded', { ...rules, decisionRule: 'guarded', standardUncertaintyUm: '0.9' }, cells(0.8)],
      ['guarded, uncertainty not known', { ...rules, decisionRule: 'guarded' }, cells(0.8)],
      ['for information', { ...rules, tolerance: null }, cells(0.5)],
      ['decimal comma', rules, cells(0.6, (text) => text.replace('.', ','))],
      [
        'inches typed',
        rules,
        unit === 'mm' ? cells(0.6) : cells(0.6, (text) => `${(Number(text) / 25_400).toFixed(6)} in`),
      ],
      ['last reading missing', rules, without(cells(0.5), 1)],
      ['three readings missing', rules, without(cells(0.5), 3)],
      ['one cannot be read', rules, { ...cells(0.5), [last]: { text: '12..5', unit } }],
      ['nothing yet', rules, { ...sheet.setUp }],
    ];
    return cases.map(([kind, own, typed]) => ({
      sheet: sheet.key,
      kind,
      rules: own,
      cells: typed,
      outcome: judgeSheet(own, definition, typed),
    }));
  });
}
