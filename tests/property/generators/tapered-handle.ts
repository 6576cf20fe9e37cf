import fc from 'fast-check';
import type { TypedValues } from '../../../shared/template/template';
import { share, sometimes, tenths, typedInches, typedMm } from './pinned';
import { INCH_THREADS, METRIC_THREADS } from './threads';

/** Valid values of a tapered handle: round and hexagonal, flats short, with the grip and run on, crowned, chamfered and plain. */
export const taperedHandleValues: fc.Arbitrary<TypedValues> = fc
  .record({
    inches: sometimes(20),
    metric: fc.constantFrom(...METRIC_THREADS.filter(({ major }) => major <= 20)),
    unified: fc.constantFrom(...INCH_THREADS),
    threadLength: tenths(10, 40),
    threadChamfer: fc.constantFrom('', '', '0', '0.5', '1'),
    spigotLength: fc.oneof({ weight: 1, arbitrary: fc.constant(0) }, { weight: 6, arbitrary: tenths(3, 25) }),
    overThread: tenths(0.5, 8),
    spigotFit: fc.constantFrom('', '', ' h9', ' f7', ' ±0.05', ' +0/-0.1'),
    overSpigot: tenths(3, 18),
    hex: fc.boolean(),
    acrossShare: fc.oneof(
      { weight: 5, arbitrary: share(0.88, 0.96) },
      { weight: 1, arbitrary: share(0.8, 0.86) },
    ),
    gripLength: tenths(20, 110),
    flats: fc.constantFrom('', '', '', 'short', 'long'),
    flatsShare: share(0.3, 0.9),
    endShare: share(0.45, 0.8),
    taperLength: tenths(40, 140),
    endForm: fc.constantFrom('crown', 'chamfer'),
    endPlain: sometimes(20),
    crownShare: share(1.6, 6),
    chamferLeg: tenths(0.5, 2),
    quantity: fc.integer({ min: 1, max: 20 }),
  })
  .map((drawn) => {
    const thread = drawn.inches ? drawn.unified : drawn.metric;
    const show = drawn.inches ? typedInches : typedMm;
    const hasSpigot = drawn.spigotLength > 0;
    const spigot = thread.major + drawn.overThread;
    const bar = Math.max(12, spigot + drawn.overSpigot);
    const across = Math.max(bar * drawn.acrossShare, (hasSpigot ? spigot : thread.major) + 0.3);
    const end = Math.max(4, Math.min(bar, drawn.hex ? across : bar) * drawn.endShare);
    const slope = (bar - end) / 2 / drawn.taperLength;
    const runOut = drawn.hex ? (bar - across) / 2 / slope : 0;
    const flatsLength =
      drawn.flats === 'short'
        ? drawn.gripLength * drawn.flatsShare
        : drawn.flats === 'long'
          ? drawn.gripLength + Math.max(1, runOut * drawn.flatsShare)
          : undefined;
    const endSize = drawn.endPlain
      ? '0'
      : drawn.endForm === 'crown'
        ? show((end / 2) * drawn.crownShare)
        : show(drawn.chamferLeg);
    return {
      thread: thread.text,
      threadLength: show(drawn.threadLength),
      threadChamfer: drawn.threadChamfer,
      spigotDiameter: hasSpigot ? `${show(spigot)}${drawn.inches ? '' : drawn.spigotFit}` : '',
      spigotLength: show(drawn.spigotLength),
      grip: drawn.hex ? 'hex' : 'round',
      barDiameter: show(bar),
      acrossFlats: drawn.hex ? show(across) : '',
      gripLength: show(drawn.gripLength),
      flatsLength: drawn.hex && flatsLength !== undefined ? show(flatsLength) : '',
      taperEndDiameter: show(end),
      taperLength: show(drawn.taperLength),
      endForm: drawn.endForm,
      endSize,
      title: 'Pinned handle',
      quantity: String(drawn.quantity),
    };
  });
