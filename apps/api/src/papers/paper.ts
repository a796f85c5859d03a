import { createRequire } from 'node:module';
import PDFDocument from 'pdfkit';

const require = createRequire(import.meta.url);
const font = (file: string) => require.resolve(`@expo-google-fonts/noto-sans/${file}.ttf`);

/** Colours of the look, for paper. */
export const ink = '#23201B';
export const inkSoft = '#5E574C';
const manila = '#F0E3C4';
const stitch = '#CDBF9F';
export const russet = '#94481F';

/** A4, in points. */
export const sheet = { width: 595.28, left: 56, right: 539.28, top: 48, bottom: 780 };

export type Paper = PDFKit.PDFDocument;

const a4 = {
  size: 'A4',
  margins: { top: sheet.top, bottom: 40, left: sheet.left, right: sheet.width - sheet.right },
};

/**
 * A blank sheet, A4 unless another is asked for, with the program's type; `made` stands in it as its date, so that the
 * same words give the same bytes.
 */
export function blankPaper(
  title: string,
  author: string,
  made: Date,
  page: Pick<PDFKit.PDFDocumentOptions, 'size' | 'margin' | 'margins'> = a4,
): Paper {
  const paper = new PDFDocument({
    ...page,
    info: {
      Title: title,
      Author: author,
      Creator: 'Hidewright',
      CreationDate: made,
      ModDate: made,
    },
    lang: 'en',
  });
  paper.registerFont('plain', font('400Regular/NotoSans_400Regular'));
  paper.registerFont('strong', font('600SemiBold/NotoSans_600SemiBold'));
  return paper.font('plain').fillColor(ink);
}

/** Ends a paper and gives its bytes. */
export function bytesOf(paper: Paper): Promise<Uint8Array> {
  return new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    paper.on('data', (part: Buffer) => parts.push(part));
    paper.on('error', reject);
    paper.on('end', () => {
      resolve(Buffer.concat(parts));
    });
    paper.end();
  });
}

/** The running stitch that separates. */
export function stitchAcross(paper: Paper, y: number): void {
  paper.save().lineWidth(1).strokeColor(stitch).dash(5, { space: 3 });
  paper.moveTo(sheet.left, y).lineTo(sheet.right, y).stroke().undash().restore();
}

/** The head of a ticket: manila, with its eyelet, its number and whom it is for. */
export function ticketHead(
  paper: Paper,
  head: { number: string; shop: string; name: string; about: string },
): void {
  const { left, right, top } = sheet;
  paper
    .save()
    .rect(left, top, right - left, 84)
    .fill(manila)
    .restore();
  paper
    .save()
    .lineWidth(2)
    .circle(left + 20, top + 22, 6)
    .fillAndStroke('#FFFFFF', '#8C7F63')
    .restore();
  paper.fillColor(ink).font('strong').fontSize(13);
  paper.text(head.number, left + 38, top + 12, { lineBreak: false });
  paper.fontSize(11).text(head.shop, left + 200, top + 14, {
    width: right - left - 214,
    align: 'right',
    lineBreak: false,
  });
  paper
    .fontSize(17)
    .text(head.name, left + 38, top + 32, { width: right - left - 60, height: 24, ellipsis: true });
  paper.font('plain').fontSize(10).fillColor(inkSoft);
  paper.text(head.about, left + 38, top + 60, {
    width: right - left - 60,
    height: 16,
    ellipsis: true,
  });
  paper.fillColor(ink);
}
