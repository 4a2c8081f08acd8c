import { asEdition } from '../as-edition';
import { definitions as newer } from '../iso-13041-1-2020/definitions';
import type { TestDefinition } from '../types';
import { numbers } from './numbers';
import { code, edition, numberSource, source } from './source';

/** The tests of the 2020 edition as they belong to that of 2004. */
export const definitions: TestDefinition[] = asEdition(newer, { code, edition, source, numbers, numberSource });
