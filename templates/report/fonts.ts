import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { Font } from '@react-pdf/renderer';
import type { FaceName } from '@/templates/report/theme';
import { unpackWoff } from '@/templates/report/unpack-woff';

/** What drawing needs of a font object of the PDF library. */
export interface FontFile {
  postscriptName: string;
  unitsPerEm: number;
  characterSet: number[];
  hasGlyphForCodePoint(codePoint: number): boolean;
  glyphForCodePoint(codePoint: number): unknown;
  layout(text: string, features?: unknown, ...rest: unknown[]): GlyphRun;
}

interface GlyphRun {
  glyphs: { advanceWidth: number }[];
  positions: Record<string, number>[];
  advanceWidth: number;
}

export type Fonts = Record<FaceName | 'fallback', FontFile>;

const resolve = createRequire(import.meta.url).resolve;
const inPackage = (name: string, path: string) => join(dirname(resolve(`${name}/package.json`)), path);
const plex = (name: 'sans' | 'mono', file: string) =>
  inPackage(`@ibm/plex-${name}`, `fonts/complete/woff/${file}.woff`);

/** The complete files: the usual subsets lack ⌀ → ≤ ≥ and Δ. DejaVu has the drawing signs that Plex lacks. */
const FILES: Record<keyof Fonts, () => string> = {
  sans: () => plex('sans', 'IBMPlexSans-Regular'),
  sansMedium: () => plex('sans', 'IBMPlexSans-Medium'),
  sansSemi: () => plex('sans', 'IBMPlexSans-SemiBold'),
  mono: () => plex('mono', 'IBMPlexMono-Regular'),
  monoMedium: () => plex('mono', 'IBMPlexMono-Medium'),
  fallback: () => inPackage('dejavu-fonts-ttf', 'ttf/DejaVuSans.ttf'),
};

/** Words laid out before; a report repeats its words, and one process draws many reports. */
const KEPT_RUNS = 20_000;

let loaded: Promise<Fonts> | null = null;

/** All fonts of the report, registered, loaded and primed once a process. */
export function loadFonts(): Promise<Fonts> {
  loaded ??= load();
  return loaded;
}

async function load(): Promise<Fonts> {
  const entries = await Promise.all(
    (Object.keys(FILES) as (keyof Fonts)[]).map(async (face) => {
      const fontFamily = `Report ${face}`;
      Font.register({ family: fontFamily, src: sourceOf(await readFile(FILES[face]())) });
      await Font.load({ fontFamily });
      const font = Font.getFont({ fontFamily })?.data as unknown as FontFile | null;
      if (!font) throw new Error(`Font not loaded: ${FILES[face]()}`);
      prime(font);
      rememberRuns(font);
      return [face, font] as const;
    }),
  );
  return Object.fromEntries(entries) as Fonts;
}

function sourceOf(file: Buffer): string {
  const plain = file.toString('latin1', 0, 4) === 'wOFF' ? unpackWoff(file) : file;
  return `data:font/ttf;base64,${plain.toString('base64')}`;
}

/**
 * A glyph remembers the characters it was first met with, for the life of the process. Met first as a part of another glyph while a
 * document is closed, it has none, and the next document's text cannot be searched or copied. So every character is met here first.
 * The ligatures FB00–FB06 stay out: they stand for two letters.
 */
function prime(font: FontFile): void {
  for (const codePoint of font.characterSet) {
    if (codePoint < 0xfb00 || codePoint > 0xfb06) font.glyphForCodePoint(codePoint);
  }
}

/** Keeps the shaped runs of words. The caller scales positions in place, so each gets its own copy of them. */
function rememberRuns(font: FontFile): void {
  const shape = font.layout.bind(font);
  const runs = new Map<string, GlyphRun>();
  font.layout = (text, features, ...rest) => {
    if (features || rest.length) return shape(text, features, ...rest);
    let run = runs.get(text);
    if (!run) {
      if (runs.size >= KEPT_RUNS) runs.clear();
      const { glyphs, positions, advanceWidth } = shape(text);
      run = { glyphs, positions, advanceWidth };
      runs.set(text, run);
    }
    return { ...run, positions: run.positions.map((position) => ({ ...position })) };
  };
}
