import type { Op, Slab } from '@/templates/report/flow/ops';
import type { FontFile, Fonts } from '@/templates/report/fonts';
import type { FaceName, TextStyle } from '@/templates/report/theme';

/** Characters that no font of the report has: the report would print another sign in their place. */
export class MissingGlyphError extends Error {
  constructor(readonly characters: string[]) {
    const named = characters.map(
      (c) => `${c} (U+${(c.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')})`,
    );
    super(`The report's fonts have no sign for: ${named.join(', ')}`);
    this.name = 'MissingGlyphError';
  }
}

export interface TextRun {
  text: string;
  font: FontFile;
}

const PLAIN = /^[\u0020-\u007e]*$/;
const KEPT_WIDTHS = 20_000;

/** Measures, breaks and sets text; remembers every character that cannot be printed. */
export class Typesetter {
  private readonly missing = new Set<string>();
  private static readonly widths = new Map<string, number>();

  constructor(readonly fonts: Fonts) {}

  /** @throws MissingGlyphError naming all characters met so far that no font has */
  assertComplete(): void {
    if (this.missing.size) throw new MissingGlyphError([...this.missing].sort());
  }

  /** The text in pieces of one font: Plex, or DejaVu for the signs that Plex lacks. */
  runs(text: string, face: FaceName): TextRun[] {
    const font = this.fonts[face];
    if (PLAIN.test(text)) return [{ text, font }];
    const runs: TextRun[] = [];
    for (const character of text) {
      const fitting = this.fontFor(character, font);
      const last = runs.at(-1);
      if (last && last.font === fitting) last.text += character;
      else runs.push({ text: character, font: fitting });
    }
    return runs;
  }

  width(text: string, style: TextStyle): number {
    const key = `${style.face}|${text}`;
    let em = Typesetter.widths.get(key);
    if (em === undefined) {
      if (Typesetter.widths.size >= KEPT_WIDTHS) Typesetter.widths.clear();
      em = this.runs(text, style.face).reduce(
        (sum, run) => sum + run.font.layout(run.text).advanceWidth / run.font.unitsPerEm,
        0,
      );
      if (!this.missing.size) Typesetter.widths.set(key, em);
    }
    return em * style.sizePt;
  }

  /** Lines no wider than `widthPt`: broken at spaces, a longer word between characters, never hyphenated. */
  lines(text: string, style: TextStyle, widthPt: number): string[] {
    return clean(text)
      .split('\n')
      .flatMap((paragraph) => this.brokenParagraph(paragraph, style, widthPt));
  }

  /** Text as a slab of as many lines as it takes. */
  paragraph(text: string, style: TextStyle, widthPt: number): Slab {
    const lines = this.lines(text, style, widthPt);
    const ops = lines.map(
      (line, index): Op => ({ op: 'text', x: 0, y: baseLine(style) + index * style.leadPt, text: line, style }),
    );
    return { heightPt: lines.length * style.leadPt, ops };
  }

  /** One line at a place; `x` is its left end, its middle or its right end. */
  line(text: string, style: TextStyle, x = 0, anchor: 'start' | 'middle' | 'end' = 'start'): Slab {
    const words = clean(text).replaceAll('\n', ' ');
    const width = anchor === 'start' ? 0 : this.width(words, style);
    if (anchor === 'start') this.runs(words, style.face);
    const left = anchor === 'end' ? x - width : anchor === 'middle' ? x - width / 2 : x;
    return { heightPt: style.leadPt, ops: [{ op: 'text', x: left, y: baseLine(style), text: words, style }] };
  }

  private brokenParagraph(paragraph: string, style: TextStyle, widthPt: number): string[] {
    if (this.width(paragraph, style) <= widthPt) return [paragraph];
    const lines: string[] = [];
    let current = '';
    for (const word of paragraph.split(' ').flatMap((w) => this.brokenWord(w, style, widthPt))) {
      const longer = current ? `${current} ${word}` : word;
      if (current && this.width(longer, style) > widthPt) {
        lines.push(current);
        current = word;
      } else current = longer;
    }
    return [...lines, current];
  }

  private brokenWord(word: string, style: TextStyle, widthPt: number): string[] {
    if (this.width(word, style) <= widthPt) return [word];
    const parts: string[] = [];
    let current = '';
    for (const character of word) {
      if (current && this.width(current + character, style) > widthPt) {
        parts.push(current);
        current = character;
      } else current += character;
    }
    return [...parts, current];
  }

  private fontFor(character: string, font: FontFile): FontFile {
    const codePoint = character.codePointAt(0) ?? 0;
    if (font.hasGlyphForCodePoint(codePoint)) return font;
    if (!this.fonts.fallback.hasGlyphForCodePoint(codePoint)) this.missing.add(character);
    return this.fonts.fallback;
  }
}

/** From the head of a line of text to its base line. */
export const baseLine = (style: TextStyle) => (style.leadPt - style.sizePt) / 2 + style.sizePt * 0.82;

/** One kind of line break, no tabs, no control characters (an indicator's transmitter may have left some in a remark). */
function clean(text: string): string {
  if (PLAIN.test(text)) return text;
  return text
    .normalize('NFC')
    .replaceAll('\r\n', '\n')
    .replaceAll('\t', ' ')
    .replace(/(?!\n)[\p{Cc}\p{Cf}]/gu, '');
}
