import type { Ink } from '@/components/plots/drawing';

/** Inks on white paper; the same hues as on the screen. */
export const PAPER_INK: Record<Exclude<Ink, 'none'>, string> = {
  ink: '#1a2026',
  ink2: '#4b545c',
  line: '#cfc9b8',
  hair: '#e4dfd0',
  blue: '#14406e',
  'blue-wash': '#dde7f1',
  brass: '#8a5d17',
  'brass-wash': '#f3e5c6',
  oxide: '#9c3318',
  'oxide-wash': '#f4ddd3',
  leaf: '#ffffff',
};

/** Page sizes and margins, pt. */
export const PAPERS = {
  A4: { widthPt: 595.28, heightPt: 841.89 },
  Letter: { widthPt: 612, heightPt: 792 },
} as const;

export const MARGIN_PT = { left: 42, right: 42, top: 34, bottom: 48 };

export type FaceName = 'sans' | 'sansMedium' | 'sansSemi' | 'mono' | 'monoMedium';

export interface TextStyle {
  face: FaceName;
  sizePt: number;
  ink: Exclude<Ink, 'none'>;
  /** Distance of two lines, pt. */
  leadPt: number;
}

const style = (face: FaceName, sizePt: number, leadPt: number, ink: TextStyle['ink'] = 'ink'): TextStyle => ({
  face,
  sizePt,
  leadPt,
  ink,
});

export const TYPE = {
  title: style('sansSemi', 17, 20),
  headline: style('sansSemi', 13, 16.5),
  heading: style('sansSemi', 11.5, 15),
  firm: style('sansSemi', 11, 14),
  strong: style('sansSemi', 8.5, 11.5),
  body: style('sans', 8.5, 11.5),
  quiet: style('sans', 8.5, 11.5, 'ink2'),
  small: style('sans', 7.5, 10, 'ink2'),
  columnHead: style('sansMedium', 7.5, 10, 'ink2'),
  figure: style('mono', 8.5, 11.5),
  figureQuiet: style('mono', 8.5, 11.5, 'ink2'),
  serial: style('mono', 13, 16),
  code: style('mono', 8.5, 11.5, 'ink2'),
} as const;
