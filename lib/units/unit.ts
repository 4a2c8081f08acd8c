/** Units a person may type behind a reading. `µ` is always U+00B5 here. */
export const UNITS = ['mm', 'µm', 'in', '°C', '°', 'µm/m', 'mm/m', 'arcsec', 'min'] as const;
export type Unit = (typeof UNITS)[number];
