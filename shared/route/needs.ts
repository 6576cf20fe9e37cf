import type { Build } from './draft';
import type { DraftNeed } from './draft';
import type { Bar } from './register';
import { cutList } from './cut-list';
import type { StockAnswer } from './stock';
import { held, short } from './shop';
import { materialName } from './words';

/** What the plan as a whole asks: bar, swing, bed. */
export function planNeeds(
  build: Build,
  stock: StockAnswer,
  bar: Bar | undefined,
  quantity: number,
): DraftNeed[] {
  const needs: DraftNeed[] = [];
  const diameter = 2 * build.stockRadius;
  const length = build.blank.x1 - build.blank.x0;
  const { lathe, words } = build;
  if (stock.short) needs.push(short('bar', stock.short.need, stock.short.why, stock.short.alternatives));
  else if (bar) {
    const spec = `${quantity} × ${words.about(length)} of ${bar.name}, ${materialName(bar.material)}`;
    const same = build.register.bars.filter(
      (b) =>
        b.material === bar.material &&
        b.shape === bar.shape &&
        Math.abs(b.size - bar.size) < 1e-6 &&
        b.quantity > 0,
    );
    const list = cutList(same, length, build.saw?.kerf ?? 2, quantity);
    needs.push(
      list.short === 0
        ? held(
            'bar',
            spec,
            bar.id,
            `${list.bars.length} bar${list.bars.length === 1 ? '' : 's'} from ${bar.place}, ${words.about(list.bars.at(-1)?.left ?? 0)} left of the last; ${bar.certified ? `certified, ${bar.certificate ?? 'certificate held'}` : 'material believed, no certificate'}.`,
          )
        : short(
            'bar',
            spec,
            `The rack gives ${list.pieces} of ${quantity}; the longest bar is ${words.length(Math.max(0, ...same.map((b) => b.length)))}.`,
            ['buy another bar', `make ${list.pieces} now`],
          ),
    );
  }
  for (const machine of [
    lathe,
    ...(build.setups.some((s) => s.machine === build.mill?.id) ? [build.mill] : []),
  ])
    if (machine && machine.speeds.length === 0)
      needs.push(
        short(
          'machine',
          `the speeds of ${machine.name}`,
          'The register gives it no speeds, so none can be chosen.',
          ['write its speeds into the register'],
        ),
      );
  const between = length;
  needs.push(
    diameter <= lathe.swingOverSlide
      ? held(
          'machine',
          `swing Ø${words.length(diameter)} over the slide`,
          lathe.id,
          `${lathe.name} swings ${words.length(lathe.swingOverSlide)}.`,
        )
      : short(
          'machine',
          `swing Ø${words.length(diameter)} over the slide`,
          `${lathe.name} swings ${words.length(lathe.swingOverSlide)}.`,
          ['another shop, with a larger lathe'],
        ),
  );
  if (build.setups.some((s) => s.support === 'centre')) {
    needs.push(
      between <= lathe.betweenCentres
        ? held(
            'machine',
            `${words.about(between)} between chuck and centre`,
            lathe.id,
            `${lathe.name} takes ${words.length(lathe.betweenCentres)} between centres.`,
          )
        : short(
            'machine',
            `${words.about(between)} between chuck and centre`,
            `${lathe.name} takes ${words.length(lathe.betweenCentres)}.`,
            ['another shop, with a longer bed'],
          ),
    );
    const centre = build.register.tools.find((t) => t.kind === 'tail-centre');
    needs.push(
      centre
        ? held('tool', 'a centre for the tail', centre.id, `${centre.name}, ${centre.place}.`)
        : short('tool', 'a centre for the tail', 'None in the register.', ['buy a running centre']),
    );
  }
  return needs;
}
