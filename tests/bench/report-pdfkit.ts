import { readFile } from 'node:fs/promises';
import PDFDocument from 'pdfkit';
import { unpackWoff } from '@/templates/report/unpack-woff';
import { FOOT, type SamplePage } from './report-sample';

const file = (package_: string, name: string) => `node_modules/@ibm/plex-${package_}/fonts/complete/woff/${name}.woff`;

/** The fonts as plain files: with WOFF, pdfkit would unpack all outlines for every glyph and be no reference. */
export async function pdfkitFonts(): Promise<{ sans: Buffer; mono: Buffer }> {
  return {
    sans: unpackWoff(await readFile(file('sans', 'IBMPlexSans-SemiBold'))),
    mono: unpackWoff(await readFile(file('mono', 'IBMPlexMono-Regular'))),
  };
}

/** The comparison's pages written directly with pdfkit, as short as it goes: nothing measured, nothing broken, fixed places. */
export function withPdfkit(samples: readonly SamplePage[], fonts: { sans: Buffer; mono: Buffer }): Promise<Buffer> {
  const doc = new PDFDocument({ size: 'A4', margin: 0, autoFirstPage: false });
  const chunks: Uint8Array[] = [];
  doc.on('data', (chunk: Uint8Array) => chunks.push(chunk));
  const done = new Promise<Buffer>((resolve) => doc.on('end', () => resolve(Buffer.concat(chunks))));
  doc.registerFont('sans', fonts.sans);
  doc.registerFont('mono', fonts.mono);
  samples.forEach((sample, index) => {
    doc.addPage();
    drawTable(doc, sample);
    drawPlot(doc, sample);
    const foot = [...FOOT, `page ${index + 1} of ${samples.length}`];
    doc.font('mono', 8).fillColor('#4b545c');
    for (const [column, text] of foot.entries()) doc.text(text, 42 + column * 220, 806, { lineBreak: false });
  });
  doc.end();
  return done;
}

function drawTable(doc: PDFKit.PDFDocument, { title, columns, rows }: SamplePage): void {
  doc.lineWidth(1).strokeColor('#1a2026').moveTo(42, 36).lineTo(553, 36).stroke();
  doc.font('sans', 11.5).fillColor('#1a2026').text(title, 42, 44, { lineBreak: false });
  const cell = (text: string, column: number, y: number) =>
    doc.text(text, 42 + (column + 1) * 70 - doc.widthOfString(text), y, { lineBreak: false });
  doc.font('mono', 8);
  for (const [column, text] of columns.entries()) cell(text, column, 68);
  for (const [row, texts] of rows.entries()) {
    const y = 84 + row * 14;
    for (const [column, text] of texts.entries()) cell(text, column, y);
    doc
      .lineWidth(0.75)
      .strokeColor('#e4dfd0')
      .moveTo(42, y + 12)
      .lineTo(322, y + 12)
      .stroke();
  }
}

function drawPlot(doc: PDFKit.PDFDocument, { points }: SamplePage): void {
  const x = (value: number) => 70 + (value / 300) * 450;
  const y = (value: number) => 500 - value * 12;
  doc.font('mono', 9).fillColor('#4b545c');
  for (const value of [-5, 0, 5, 10]) {
    doc.lineWidth(0.75).strokeColor('#e4dfd0').moveTo(70, y(value)).lineTo(520, y(value)).stroke();
    doc.text(String(value), 48, y(value) - 5, { lineBreak: false });
  }
  for (const value of [0, 75, 150, 225, 300]) doc.text(String(value), x(value) - 8, 566, { lineBreak: false });
  doc.text('reading, µm', 42, 380, { lineBreak: false }).text('z, mm', 280, 580, { lineBreak: false });
  doc.lineWidth(1.5).strokeColor('#14406e');
  for (const [index, point] of points.entries()) {
    if (index) doc.lineTo(x(Number(point.x)), y(Number(point.y)));
    else doc.moveTo(x(Number(point.x)), y(Number(point.y)));
  }
  doc.stroke();
  doc.lineWidth(1).strokeColor('#1a2026').moveTo(530, y(-4)).lineTo(530, y(11)).stroke();
}
