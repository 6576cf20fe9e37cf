import PDFDocument from 'pdfkit';
import SVGtoPDF from 'svg-to-pdfkit';
import type { Subset } from './faces';
import { face, subsets } from './faces';
import { splitTexts } from './split-texts';

const POINTS_PER_MM = 72 / 25.4;

export interface PdfFacts {
  title: string;
  /** Moment the document says it was made; the same facts and sheets then give the same bytes. */
  date?: Date;
}

/**
 * Sheets as one PDF, a page each, in true size and as vectors. Each SVG must be one of ours: sized in mm.
 * @throws Error when an SVG has no size in mm.
 */
export function sheetPdf(svgs: readonly string[], facts: PdfFacts): Promise<Uint8Array> {
  return new Promise((resolve, reject) => {
    const info = {
      Title: facts.title,
      Producer: 'Benchleaf',
      Creator: 'Benchleaf',
      CreationDate: facts.date ?? new Date(0),
    };
    const document = new PDFDocument({ autoFirstPage: false, margin: 0, info, lang: 'en-GB' });
    const chunks: Buffer[] = [];
    document.on('data', (chunk: Buffer) => chunks.push(chunk));
    document.on('end', () => resolve(Buffer.concat(chunks)));
    document.on('error', reject);
    const lettered = faceOf(document);
    try {
      for (const svg of svgs) {
        const { width, height } = sizeOf(svg);
        document.addPage({ size: [width * POINTS_PER_MM, height * POINTS_PER_MM], margin: 0 });
        SVGtoPDF(document, splitTexts(svg), 0, 0, { fontCallback: lettered });
      }
      document.end();
    } catch (error) {
      reject(error instanceof Error ? error : new Error(String(error)));
    }
  });
}

/** Names the face of a run for the document; one that was not used yet is registered first, so that a sheet carries only its own. */
function faceOf(document: PDFKit.PDFDocument): (family: string, isBold: boolean) => string {
  const registered = new Set<string>();
  return (family, isBold) => {
    const subset: Subset = subsets.find((one) => one === family) ?? 'latin';
    const weight = isBold ? 700 : 400;
    const name = `${subset}-${weight}`;
    if (!registered.has(name)) document.registerFont(name, face(subset, weight));
    registered.add(name);
    return name;
  };
}

/** Millimetres, from the root's own attributes. */
function sizeOf(svg: string): { width: number; height: number } {
  const match = /^<svg [^>]*?width="([\d.]+)mm" height="([\d.]+)mm"/.exec(svg);
  const [width, height] = [Number(match?.[1]), Number(match?.[2])];
  if (!(width > 0) || !(height > 0)) throw new Error('This SVG has no size in millimetres.');
  return { width, height };
}
