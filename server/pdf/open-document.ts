import PDFDocument from 'pdfkit';
import type { PaperSize } from './paper.ts';

/** What the file says of itself. */
export interface DocumentInfo {
  readonly title: string;
  readonly author: string;
  readonly subject: string;
  readonly language: string;
  /** The clock, from outside: the same input and date give the same bytes. */
  readonly date: Date;
}

const escapeXml = (text: string): string =>
  text
    // Characters that XML has no form for.
    .replace(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, '\ufffd')
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;');

/** Opens a tagged PDF/A-3a document without pages. None of the standard 14 fonts comes in. */
export function openDocument(paper: PaperSize, info: DocumentInfo): PDFKit.PDFDocument {
  const doc = new PDFDocument({
    autoFirstPage: false,
    size: [paper.width, paper.height],
    margin: 0,
    // Without this PDFKit opens with Helvetica.
    font: '',
    pdfVersion: '1.7',
    subset: 'PDF/A-3a',
    tagged: true,
    displayTitle: true,
    lang: info.language,
    info: {
      Title: info.title,
      Author: info.author,
      Subject: info.subject,
      Creator: 'Stanchion',
      Producer: 'Stanchion',
      CreationDate: info.date,
      ModDate: info.date,
    },
  });
  escapeMetadata(doc);
  return doc;
}

/** PDFKit puts the fields into the XMP as they are, `&` and `<` with them; the Info stays plain. */
function escapeMetadata(doc: PDFKit.PDFDocument): void {
  const endMetadata = doc.endMetadata.bind(doc);
  doc.endMetadata = () => {
    const { Title = '', Author = '', Subject = '' } = doc.info;
    Object.assign(doc.info, {
      Title: escapeXml(Title),
      Author: escapeXml(Author),
      Subject: escapeXml(Subject),
    });
    endMetadata();
  };
}
