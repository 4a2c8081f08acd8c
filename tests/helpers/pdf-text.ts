import { PDFParse } from 'pdf-parse';

/** Words of a PDF as a reader's search finds them, page by page; signs in their common form (µ and μ are one). */
export async function pdfText(pdf: Uint8Array): Promise<{ pages: string[]; text: string }> {
  const parser = new PDFParse({ data: new Uint8Array(pdf) });
  try {
    const result = await parser.getText();
    const pages = result.pages.map((page) => page.text.normalize('NFKC'));
    return { pages, text: pages.join('\n') };
  } finally {
    await parser.destroy();
  }
}

/** The same without line breaks and double spaces, for words that go over a line's end. */
export const flat = (text: string) => text.normalize('NFKC').replace(/\s+/g, ' ');
