import { execFile } from 'node:child_process';
import { mkdtemp, readFile, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);

export interface PdfPage {
  /** Points. */
  width: number;
  height: number;
  /** Dark dots of the page drawn at 100 dots an inch. */
  ink: number;
  /** Grey dots: neither paper nor ink. */
  grey: number;
  dots: { width: number; height: number; at: (x: number, y: number) => number };
}

/** The pages of a PDF as an independent reader draws them, and the text it finds. Needs Debian's poppler-utils. */
export async function readPdf(pdf: Buffer): Promise<{ pages: PdfPage[]; text: string }> {
  const folder = await mkdtemp(join(tmpdir(), 'benchleaf-pdf-'));
  try {
    const file = join(folder, 'sheet.pdf');
    await writeFile(file, pdf);
    const info = (await run('pdfinfo', ['-f', '1', '-l', '99', file])).stdout;
    const sizes = [...info.matchAll(/^Page\s+\d+ size:\s+([\d.]+) x ([\d.]+) pts/gm)];
    await run('pdftoppm', ['-gray', '-r', '100', file, join(folder, 'page')]);
    const names = (await readdir(folder)).filter((name) => name.endsWith('.pgm')).sort();
    const pages = await Promise.all(
      names.map(async (name, index) => pageOf(await readFile(join(folder, name)), sizes[index])),
    );
    const text = (await run('pdftotext', ['-layout', file, '-'])).stdout;
    return { pages, text };
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

function pageOf(pgm: Buffer, size: RegExpMatchArray | undefined): PdfPage {
  const head = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(pgm.toString('latin1', 0, 40));
  if (!head || !size) throw new Error('The page was not drawn.');
  const [width, height] = [Number(head[1]), Number(head[2])];
  const dots = pgm.subarray(head[0].length);
  let [ink, grey] = [0, 0];
  for (const dot of dots) {
    if (dot < 128) ink += 1;
    else if (dot < 230) grey += 1;
  }
  return {
    ...{ width: Number(size[1]), height: Number(size[2]), ink, grey },
    dots: { width, height, at: (x, y) => dots[y * width + x] ?? 255 },
  };
}
