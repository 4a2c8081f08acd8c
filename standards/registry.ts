import { definitions as commonPractice } from './common-practice/definitions';
import * as commonPracticeSource from './common-practice/source';
import { definitions as functionChecks } from './function-checks/definitions';
import * as functionChecksSource from './function-checks/source';
import { definitions as rotation } from './iso-230-7-2015/definitions';
import * as rotationSource from './iso-230-7-2015/source';
import { definitions as engineLathes } from './iso-1708-1989/definitions';
import * as engineLathesSource from './iso-1708-1989/source';
import { definitions as geometric2004 } from './iso-13041-1-2004/definitions';
import * as geometric2004Source from './iso-13041-1-2004/source';
import { definitions as geometric2020 } from './iso-13041-1-2020/definitions';
import * as geometric2020Source from './iso-13041-1-2020/source';
import { definitions as positioning } from './iso-13041-4-2004/definitions';
import * as positioningSource from './iso-13041-4-2004/source';
import { definitions as feedsAndSpeeds } from './iso-13041-5-2006/definitions';
import * as feedsAndSpeedsSource from './iso-13041-5-2006/source';
import { definitions as testPiece } from './iso-13041-6-2009/definitions';
import * as testPieceSource from './iso-13041-6-2009/source';
import { definitions as contouring } from './iso-13041-7-2004/definitions';
import * as contouringSource from './iso-13041-7-2004/source';
import { definitions as thermal } from './iso-13041-8-2004/definitions';
import * as thermalSource from './iso-13041-8-2004/source';
import type { Provenance, TestDefinition } from './types';

export interface TestCode {
  code: string;
  /** '' where there is none. */
  edition: string;
  subject: string;
  source: Provenance;
}

/** Every code with its definitions, in the order in which they are offered. */
const books = [
  { ...geometric2020Source, definitions: geometric2020 },
  { ...geometric2004Source, definitions: geometric2004 },
  { ...engineLathesSource, definitions: engineLathes },
  { ...commonPracticeSource, definitions: commonPractice },
  { ...functionChecksSource, definitions: functionChecks },
  { ...positioningSource, definitions: positioning },
  { ...feedsAndSpeedsSource, definitions: feedsAndSpeeds },
  { ...testPieceSource, definitions: testPiece },
  { ...contouringSource, definitions: contouring },
  { ...thermalSource, definitions: thermal },
  { ...rotationSource, definitions: rotation },
];

const all: TestDefinition[] = books.flatMap(({ definitions }) => definitions);

/** Every version of every definition: old ones stay, because stored sheets are judged by the one that they were made with. */
export function allDefinitions(): readonly TestDefinition[] {
  return all;
}

/** Definitions that a new plan uses: the newest version of each id within its code and edition. */
export function currentDefinitions(): TestDefinition[] {
  return all.filter(
    (candidate) => !all.some((other) => sameTest(other, candidate) && other.version > candidate.version),
  );
}

export function findDefinition(id: string, code: string, edition: string, version: number): TestDefinition | null {
  return (
    all.find((one) => one.id === id && one.code === code && one.edition === edition && one.version === version) ?? null
  );
}

export function codes(): TestCode[] {
  return books.map(({ code, edition, subject, source }) => ({ code, edition, subject, source }));
}

/** `ISO 13041-1:2020`, `common practice`. */
export function codeTitle(code: string, edition: string): string {
  return edition === '' ? code : `${code}:${edition}`;
}

function sameTest(a: TestDefinition, b: TestDefinition): boolean {
  return a.id === b.id && a.code === b.code && a.edition === b.edition;
}
