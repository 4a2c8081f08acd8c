import { v7 } from 'uuid';

/** Ids are made by the application, in order of time, so that tables can be distributed without a sequence. */
export const newId = (): string => v7();
