import type { Part } from '../part/part';
import { buildScope } from '../template/build-scope';
import { sizeInstances, type SizeInstance } from '../template/size-instances';
import type { Evaluation, Template } from '../template/template';
import { anchorOf, stationAt } from './anchors';
import { numberBalloons } from './balloons';
import { completenessOf } from './completeness';
import { generalToleranceById, type GeneralTolerance } from './general-tolerance';
import { limitsOf } from './limits';
import type { Scheme, Size } from './scheme';

export interface SchemeOptions {
  /** `ISO 2768-f`, `-m`, `-c`, `-v` or `shop-inch`. */
  generalTolerance: string;
  /** Numbers frozen by a release, by size id. */
  balloons?: Readonly<Record<string, number>>;
}

/** Every size of the part, its limits, its anchor and its balloon, in reading order; and whether they are complete and once. */
export function buildScheme(
  template: Template,
  evaluation: Evaluation & { part: Part },
  options: SchemeOptions,
): Scheme {
  const { part, parameters } = evaluation;
  const general = generalToleranceById(options.generalTolerance);
  const unnumbered = sizeInstances(template, parameters, buildScope(template, parameters)).map((size) =>
    sizeOf(size, part, general),
  );
  const balloons = numberBalloons(unnumbered, options.balloons);
  const sizes = unnumbered
    .map((size, index) => ({ size: { ...size, balloon: balloons.get(size.id) ?? 0 }, index }))
    .sort((a, b) => rank(a.size) - rank(b.size) || a.index - b.index)
    .map(({ size }) => size);
  return {
    sizes,
    completeness: completenessOf(part, sizes),
    datum: part.datum,
    generalTolerance: { id: general.id, text: general.text },
  };
}

/** Reference sizes come last; all others by their balloon. */
function rank({ balloon, reference }: Size): number {
  return reference ? Number.MAX_SAFE_INTEGER : balloon;
}

function sizeOf(instance: SizeInstance, part: Part, general: GeneralTolerance): Size {
  const { template, nominal } = instance;
  const thread = part.features.find(
    (feature) => feature.kind === 'thread' && instance.features.includes(feature.id),
  );
  const { tolerance, source, designation } = limitsOf(
    instance,
    general,
    thread?.kind === 'thread' ? thread.designation : undefined,
  );
  const anchor = anchorOf(instance, part);
  const [from, to] = anchor.kind === 'span' ? [stationAt(part, anchor.from), stationAt(part, anchor.to)] : [];
  return {
    id: instance.id,
    balloon: 0,
    kind: template.kind,
    features: instance.features,
    ...(instance.parameter === undefined ? {} : { parameter: instance.parameter }),
    nominal,
    upperLimit: nominal + tolerance.upper,
    lowerLimit: nominal + tolerance.lower,
    tolerance,
    toleranceSource: source,
    typed: instance.typed,
    ...(designation === undefined ? {} : { designation }),
    reference: template.reference ?? false,
    ...(from === undefined ? {} : { from }),
    ...(to === undefined ? {} : { to }),
    anchor,
  };
}
