/** For a list to choose from, UTC first. */
export const timeZones = (): string[] => [
  'UTC',
  ...Intl.supportedValuesOf('timeZone').filter((zone) => zone !== 'UTC'),
];
