import { readFile } from 'node:fs/promises';
import { measure, printTable } from './measure';
import { launchBrowser } from '../browser/launch';
import { exampleRequest } from '../gallery/example-request';
import { sheetPdf } from '../../server/pdf/sheet-pdf';
import { runEngine } from '../../shared/engine-run';
import { templates } from '../../templates';

const RUNS = 20;

/** A PDF page from the sheet's SVG, against Chromium printing the same SVG from a new page. Aim: under 80 ms and the faster. */
export async function benchPdf(): Promise<void> {
  const face = await readFile(
    'node_modules/@fontsource/jetbrains-mono/files/jetbrains-mono-latin-400-normal.woff2',
  );
  const style = `@font-face{font-family:"JetBrains Mono";src:url(data:font/woff2;base64,${face.toString('base64')})}@page{size:297mm 210mm;margin:0}body{margin:0;font-family:"JetBrains Mono"}`;
  const browser = await launchBrowser();
  const rows = [];
  try {
    for (const template of templates) {
      const { good } = runEngine(exampleRequest(template, 'iso', 'mm'));
      if (!good) throw new Error(`The worked example of ${template.id} does not draw.`);
      const own = await measure(`${template.id} by pdfkit`, RUNS, () =>
        sheetPdf([good.svg], { title: template.name }),
      );
      const chromium = await measure(`${template.id} by Chromium`, RUNS, async () => {
        const page = await browser.newPage();
        await page.setContent(`<style>${style}</style>${good.svg}`);
        await page.pdf({ preferCSSPageSize: true });
        await page.close();
      });
      rows.push(own, chromium);
      console.log(
        `${template.id}: pdfkit takes ${(own.median / chromium.median).toFixed(2)} of Chromium's time`,
      );
    }
  } finally {
    await browser.close();
  }
  printTable('PDF page', rows);
}
