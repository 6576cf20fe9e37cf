import { measure, printTable, type Measured } from './measure';
import { exampleRequest } from '../gallery/example-request';
import { runEngine } from '../../shared/engine-run';
import { evaluate } from '../../shared/template/evaluate';
import { buildScheme } from '../../shared/scheme/build';
import { checkSheet } from '../../shared/drawing/check/check-sheet';
import { drawSheet } from '../../shared/drawing/draw';
import { planRoute } from '../../shared/route/plan';
import { simulate } from '../../shared/simulate/simulate';
import { exampleRegister } from '../../shared/route/example-register';
import { renderSvg } from '../../shared/render/svg';
import { titleBlockFor } from '../../shared/title-block';
import { templates } from '../../templates';

const AIM_SHEET = 16;
const RUNS = 100;

/** Values to checked sheet to SVG, and the route beside it, for each family's worked example in both styles. */
export async function benchEngine(): Promise<void> {
  const sheets: Measured[] = [];
  const routes: Measured[] = [];
  for (const template of templates) {
    for (const style of ['iso', 'asme'] as const) {
      const request = exampleRequest(template, style, style === 'asme' ? 'in' : 'mm');
      const full = runEngine(request);
      if (!full.good) throw new Error(`The worked example of ${template.id} does not draw.`);
      const { route } = full.good;
      sheets.push(
        await measure(`${template.id} ${style}`, RUNS, () => {
          const evaluation = evaluate(template, request.typed, { entryUnit: request.entryUnit });
          if (!evaluation.part) throw new Error('no part');
          const good = { ...evaluation, part: evaluation.part };
          const scheme = buildScheme(template, good, { generalTolerance: 'ISO 2768-m' });
          const drawn = drawSheet(good.part, scheme, {
            ...request,
            titleBlock: titleBlockFor(request, good, scheme, route),
          });
          if ('problem' in drawn) throw new Error(drawn.problem.message);
          checkSheet(drawn.sheet, scheme, good.part);
          return renderSvg(drawn.sheet);
        }),
      );
    }
    const request = exampleRequest(template, 'iso', 'mm');
    const { good } = runEngine(request);
    if (!good) throw new Error('no part');
    const plan = () =>
      planRoute(good.part, good.scheme, exampleRegister, { quantity: 1, material: good.part.material });
    routes.push(await measure(`${template.id} plan`, RUNS, plan));
    const planned = plan().route;
    if (planned)
      routes.push(await measure(`${template.id} simulate`, RUNS, () => simulate(planned, good.part)));
    routes.push(await measure(`${template.id} everything`, RUNS, () => runEngine(request)));
  }
  printTable(`Values to checked sheet to SVG (aim: median under ${AIM_SHEET} ms)`, sheets);
  printTable('Route', routes);
}
