/** What the reader chose; without a choice the system's light or dark counts. */
export const themes = ['system', 'light', 'dark'] as const;
export type Theme = (typeof themes)[number];

export const themeCookie = 'witnessmark-theme';

export const readTheme = (value: string | undefined): Theme => themes.find((theme) => theme === value) ?? 'system';
