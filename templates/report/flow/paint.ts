import type { DrawingItem, Ink } from '@/components/plots/drawing';
import type { Op } from '@/templates/report/flow/ops';
import type { Typesetter } from '@/templates/report/flow/typesetter';
import { type FaceName, PAPER_INK, type TextStyle } from '@/templates/report/theme';

/** The part of the PDF library's painter that a report needs. */
export interface Painter {
  font(source: unknown, family: string, sizePt: number): Painter;
  text(text: string, x: number, y: number, options: object): Painter;
  moveTo(x: number, y: number): Painter;
  lineTo(x: number, y: number): Painter;
  rect(x: number, y: number, width: number, height: number): Painter;
  roundedRect(x: number, y: number, width: number, height: number, radius: number): Painter;
  path(d: string): Painter;
  stroke(): Painter;
  fill(colour?: string): Painter;
  fillAndStroke(fill: string, stroke: string): Painter;
  fillColor(colour: string): Painter;
  strokeColor(colour: string): Painter;
  lineWidth(widthPt: number): Painter;
  dash(length: number | number[], options?: object): Painter;
  save(): Painter;
  restore(): Painter;
  translate(x: number, y: number): Painter;
  scale(factor: number): Painter;
  rotate(deg: number): Painter;
}

const TEXT_OPTIONS = { lineBreak: false, baseline: 'alphabetic' };

/** Puts ops on a page, in their order: what is read out of the PDF comes in the order in which it was painted. */
export class PagePainter {
  /** Ink of the text before: said again only when it changes. */
  private letters: Ink | null = null;
  /** Ink and width of the line before, likewise. */
  private rule: { ink: Ink; widthPt: number } | null = null;

  constructor(
    private readonly painter: Painter,
    private readonly type: Typesetter,
  ) {}

  paint(ops: readonly Op[], x = 0, y = 0): void {
    for (const op of ops) this.one(op, x, y);
  }

  private one(op: Op, x: number, y: number): void {
    // Pictures are laid over the canvas by the document itself.
    if (op.op === 'picture') return;
    if (op.op === 'group') this.paint(op.ops, x + op.x, y + op.y);
    else if (op.op === 'text') this.text(op.text, x + op.x, y + op.y, op.style);
    else if (op.op === 'drawing') this.drawing(op.items, x + op.x, y + op.y, op.scale);
    else if (op.op === 'line' && !op.dash) this.line(op, x, y);
    else {
      const { letters, rule } = this;
      this.painter.save();
      if (op.op === 'turned') this.turned(op, x, y);
      else if (op.op === 'line') this.line(op, x, y);
      else this.box(op, x, y);
      this.painter.restore();
      [this.letters, this.rule] = [letters, rule];
    }
  }

  private turned(op: Extract<Op, { op: 'turned' }>, x: number, y: number): void {
    this.painter.translate(x + op.x, y + op.y).rotate(op.deg);
    this.text(op.text, -this.type.width(op.text, op.style) / 2, op.style.sizePt * 0.35, op.style);
  }

  private line(op: Extract<Op, { op: 'line' }>, x: number, y: number): void {
    const { painter, rule } = this;
    if (rule?.ink !== op.ink) painter.strokeColor(colour(op.ink));
    if (rule?.widthPt !== op.widthPt) painter.lineWidth(op.widthPt);
    this.rule = op;
    if (op.dash) painter.dash(op.dash);
    painter
      .moveTo(x + op.x1, y + op.y1)
      .lineTo(x + op.x2, y + op.y2)
      .stroke();
  }

  private box(op: Extract<Op, { op: 'box' }>, x: number, y: number): void {
    const painter = this.painter.lineWidth(op.lineWidthPt);
    if (op.radiusPt) painter.roundedRect(x + op.x, y + op.y, op.widthPt, op.heightPt, op.radiusPt);
    else painter.rect(x + op.x, y + op.y, op.widthPt, op.heightPt);
    this.finish(op.ink, op.fill ?? 'none');
  }

  private text(text: string, x: number, y: number, style: Pick<TextStyle, 'face' | 'sizePt' | 'ink'>): void {
    if (text === '') return;
    if (this.letters !== style.ink) this.painter.fillColor(PAPER_INK[style.ink]);
    this.letters = style.ink;
    let at = x;
    for (const run of this.type.runs(text, style.face)) {
      this.painter.font(run.font, run.font.postscriptName, style.sizePt).text(run.text, at, y, TEXT_OPTIONS);
      at += (run.font.layout(run.text).advanceWidth / run.font.unitsPerEm) * style.sizePt;
    }
  }

  private drawing(items: readonly DrawingItem[], x: number, y: number, scale: number): void {
    const { painter } = this;
    painter.save().translate(x, y).scale(scale);
    for (const item of items) {
      if (item.kind === 'path') this.path(item);
    }
    painter.restore();
    for (const item of items) {
      if (item.kind === 'text') this.drawnText(item, x, y, scale);
    }
  }

  private path(item: Extract<DrawingItem, { kind: 'path' }>): void {
    const { painter } = this;
    painter.save().lineWidth(item.widthPx ?? 1.5);
    if (item.dash?.length) painter.dash(item.dash);
    painter.path(item.d);
    this.finish(item.stroke, item.fill ?? 'none');
    painter.restore();
  }

  private drawnText(item: Extract<DrawingItem, { kind: 'text' }>, x: number, y: number, scale: number): void {
    const ink = item.ink === 'none' ? 'ink' : item.ink;
    const style = { face: faceOf(item), sizePt: item.sizePx * scale, ink, leadPt: 0 };
    const width = item.anchor === 'start' ? 0 : this.type.width(item.text, style);
    const left = x + item.x * scale - (item.anchor === 'end' ? width : item.anchor === 'middle' ? width / 2 : 0);
    this.text(item.text, left, y + item.y * scale, style);
  }

  private finish(ink: Ink, fill: Ink): void {
    const { painter } = this;
    if (fill !== 'none' && ink !== 'none') painter.fillAndStroke(colour(fill), colour(ink));
    else if (fill !== 'none') painter.fill(colour(fill));
    else if (ink !== 'none') painter.strokeColor(colour(ink)).stroke();
  }
}

const colour = (ink: Ink) => (ink === 'none' ? PAPER_INK.ink : PAPER_INK[ink]);

function faceOf(item: { mono?: boolean; weight?: 400 | 500 | 600 }): FaceName {
  if (item.mono) return item.weight && item.weight > 400 ? 'monoMedium' : 'mono';
  if (item.weight === 600) return 'sansSemi';
  return item.weight === 500 ? 'sansMedium' : 'sans';
}
