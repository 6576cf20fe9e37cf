import type { Build } from '../draft';
import type { View } from '../features';
import type { Session } from '../session';
import { held, short } from '../shop';

/** Leg of an edge that carries no size of its own (mm), as the sheet's general note gives it. Common practice. */
const EDGE_BREAK = 0.2;

/** Sawing the piece from the bar: an event, since the saw's width lies outside the blank. */
export function sawPiece(build: Build, view: View, kind: 'bar' | 'stick' | 'blank'): void {
  if (kind === 'bar') return;
  const length = build.blank.x1 - build.blank.x0;
  const { saw, words } = build;
  const diameter = 2 * build.stockRadius;
  const spec = `saw for Ø${words.length(diameter)}`;
  const fits = saw !== null && diameter <= saw.maximumDiameter;
  build.operations.push({
    key: 'saw',
    method: 'saw',
    title: `saw ${words.about(length)} long`,
    setup: 'S1',
    end: view.flipped ? 'left' : 'right',
    features: [],
    machine: saw?.id ?? 'saw',
    tool: saw?.name ?? 'hacksaw',
    toolItem: saw?.id,
    toolMaterial: 'hss',
    toolFigures: {},
    figures: null,
    after: [],
    stops: [],
    reasons: [kind === 'blank' ? 'saw-blank' : 'stick-for-milling'],
    notes: [],
    check: 'rule',
    handling: 2 + diameter / 20,
    needs: [
      fits && saw
        ? held(
            'machine',
            spec,
            saw.id,
            `${saw.name} takes ${words.length(saw.maximumDiameter)}; kerf ${words.length(saw.kerf)}.`,
          )
        : short(
            'machine',
            spec,
            saw ? `${saw.name} takes ${words.length(saw.maximumDiameter)}.` : 'No saw in the register.',
            ['saw by hand', 'buy the piece cut to length'],
          ),
    ],
  });
}

/** Edges, the mate, and the last measuring, on the bench. */
export function finishPiece(build: Build, session: Session): void {
  const file = build.register.tools.find((t) => t.kind === 'file');
  const threads = build.views.right.part.features.filter((f) => f.kind === 'thread');
  const step = (
    key: string,
    method: 'deburr' | 'fit-check' | 'inspect',
    title: string,
    rest: {
      features: string[];
      tool: string;
      toolItem?: string;
      check: string;
      handling: number;
      rule: 'edges-last' | 'fit-before-inspect' | 'inspect-last';
    },
  ): void => {
    const before = build.operations[build.operations.length - 1];
    build.operations.push({
      key,
      method,
      title,
      setup: session.id,
      end: 'both',
      features: rest.features,
      machine: 'bench',
      tool: rest.tool,
      ...(rest.toolItem ? { toolItem: rest.toolItem } : {}),
      toolMaterial: 'hss',
      toolFigures: {},
      figures: null,
      after: before ? [{ key: before.key, rule: rest.rule }] : [],
      stops: [],
      reasons: [rest.rule],
      notes: [],
      check: rest.check,
      handling: rest.handling,
      needs:
        method === 'deburr'
          ? [
              file
                ? held('tool', 'file', file.id, `${file.name}, ${file.place}.`)
                : short('tool', 'file', 'None in the register.'),
            ]
          : [],
    });
  };
  step('deburr', 'deburr', `break all edges ${build.words.about(EDGE_BREAK)}`, {
    features: [],
    tool: file?.name ?? 'file',
    toolItem: file?.id,
    check: 'by finger',
    handling: 1.5,
    rule: 'edges-last',
  });
  if (threads.length > 0)
    step('fit-check', 'fit-check', 'try in the mate', {
      features: threads.map((t) => t.id),
      tool: 'the mate, or a ring gauge',
      check: 'runs on by hand, no shake',
      handling: 1,
      rule: 'fit-before-inspect',
    });
  step('final', 'inspect', 'final check, every size', {
    features: build.views.right.part.features.map((f) => f.id),
    tool: 'by the table of sizes',
    check: '',
    handling: 3,
    rule: 'inspect-last',
  });
}
