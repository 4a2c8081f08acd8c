import packageJson from '@/package.json';

/** Shown on the screen and on every report. */
export const version: string = packageJson.version;
