import { Canvas, Document, Image, Page, View } from '@react-pdf/renderer';
import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { PagePainter, type Painter } from '@/templates/report/flow/paint';
import { picturesOf } from '@/templates/report/flow/pictures';
import type { ReportPages } from '@/templates/report/report-pages';

/**
 * The report as a PDF document: one canvas a page, since a text element a cell costs many times more. A mark for the outline stands
 * where each section and test begins.
 */
export function ReportDocument(props: { model: ReportModel; made: ReportPages; date: Date; photos: ReportPhotos }) {
  const { model, made, date, photos } = props;
  const { widthPt, heightPt } = made.paper;
  const { number, revision } = model.document;
  const title = `${REPORT_WORDS.title} ${number} ${REPORT_WORDS.revisionShort}${revision}, ${model.machine.manufacturer} ${model.machine.model} ${model.machine.serialNumber}`;
  return (
    <Document
      title={title}
      author={model.letterhead.name}
      subject={model.headline}
      creator={`Witnessmark ${model.document.programVersion}`}
      producer="Witnessmark"
      language={model.language}
      creationDate={date}
      modificationDate={date}
    >
      {made.pages.map((page, index) => (
        <Page key={index} size={[widthPt, heightPt]}>
          {page.bookmarks.map(({ title: name, yPt }) => (
            <View
              key={`${name} ${yPt}`}
              style={{ position: 'absolute', top: yPt, left: 0, width: 1, height: 1 }}
              {...inOutline(name)}
            />
          ))}
          <Canvas
            style={{ position: 'absolute', top: 0, left: 0, width: widthPt, height: heightPt - 1 }}
            paint={(painter) => {
              new PagePainter(painter as unknown as Painter, made.type).paint(page.ops);
              return null;
            }}
          />
          {picturesOf(page.ops).map(({ fileId, xPt, yPt, widthPt, heightPt }) => {
            const data = photos[fileId]!;
            return (
              <Image
                key={fileId}
                src={{ data: Buffer.from(data), format: 'jpg' }}
                style={{ position: 'absolute', left: xPt, top: yPt, width: widthPt, height: heightPt }}
              />
            );
          })}
        </Page>
      ))}
    </Document>
  );
}

/** Photographs of the model (JPEG), by their file. */
export type ReportPhotos = Readonly<Record<string, Uint8Array>>;

/** The library takes a bookmark on every node; its types name it on pages only. */
const inOutline = (bookmark: string): object => ({ bookmark });
