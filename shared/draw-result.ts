import { ENGINE_VERSION, type EngineGood, type EngineResult } from './engine';
import type { DrawResult } from './api/contract';
import type { EvaluatedParameters } from './template/template';
import type { Part } from './part/part';
import { partMass, volume } from './part/volume';
import { materialById } from './standards/materials';
import { toDegrees } from './units/angle';

/** Features whose own figures are radians inside and degrees in the JSON. */
const ANGULAR_FIGURES = new Set(['halfAngle', 'angle', 'phase']);

/**
 * A good engine result as the JSON other programs read (schema `drawResult`).
 * @throws Error when the material has no density: the table is the engine's own.
 */
export function drawResultOf(result: EngineResult & { good: EngineGood }): DrawResult {
  const { evaluation, good } = result;
  const { part, scheme, sheet, route } = good;
  const printed = new Map(
    sheet.groups.flatMap((group) =>
      group.role === 'dimension' && group.sizeId ? [[group.sizeId, group.text ?? ''] as const] : [],
    ),
  );
  return {
    schemaVersion: 1,
    template: evaluation.template,
    templateHash: evaluation.templateHash,
    engine: ENGINE_VERSION,
    parameters: parametersOf(evaluation.parameters),
    part: partOf(part),
    sizes: scheme.sizes.map((size) => ({
      id: size.id,
      balloon: size.balloon,
      kind: size.kind,
      features: [...size.features],
      text: printed.get(size.id) ?? size.typed,
      nominal: size.nominal,
      upperLimit: size.upperLimit,
      lowerLimit: size.lowerLimit,
      from: size.from,
      to: size.to,
      reference: size.reference,
      toleranceSource: size.toleranceSource,
    })),
    completeness: {
      missing: [...scheme.completeness.missing],
      redundant: [...scheme.completeness.redundant],
    },
    check: good.findings.map((finding) => ({ ...finding, entities: [...finding.entities] })),
    sheet: {
      size: sheet.size,
      scale: sheet.scale,
      style: sheet.style,
      unit: sheet.unit,
      views: sheet.maps.map((map) => map.view),
    },
    route: route && routeOf(route),
    capacity: {
      verdict: good.capacity.verdict,
      needs: good.capacity.needs.map(({ operation, need, state, why, alternatives }) => ({
        operation,
        need,
        state,
        why,
        alternatives: [...alternatives],
      })),
    },
  };
}

function parametersOf(parameters: EvaluatedParameters): Record<string, unknown> {
  const plain: Record<string, unknown> = {};
  for (const [name, value] of Object.entries(parameters.values)) plain[name] = value.value;
  for (const [name, rows] of Object.entries(parameters.tables)) {
    plain[name] = rows.map((row) =>
      Object.fromEntries(Object.entries(row.values).map(([column, value]) => [column, value.value])),
    );
  }
  return plain;
}

function partOf(part: Part): DrawResult['part'] {
  const material = materialById(part.material);
  if (!material) throw new Error(`The materials table has no "${part.material}".`);
  return {
    length: part.length,
    maxDiameter: part.maxDiameter,
    volume: volume(part.body),
    mass: partMass(part, material.density),
    density: material.density,
    material: part.material,
    stations: part.stations.map(({ id, x }) => ({ id, x })),
    features: part.features.map((feature) => {
      const figures = Object.entries(feature).map(([name, value]) => [
        name,
        ANGULAR_FIGURES.has(name) && typeof value === 'number' ? toDegrees(value) : value,
      ]);
      return Object.fromEntries(figures) as DrawResult['part']['features'][number];
    }),
  };
}

function routeOf(route: NonNullable<EngineGood['route']>): DrawResult['route'] {
  const { shape, size, material, bar } = route.stock;
  return {
    stock: { shape, size, material, bar },
    blankLength: route.blankLength,
    setups: route.setups.map(({ id, machine, holding, gripFrom, gripTo, freeEnd, support, heldOn }) => ({
      id,
      machine,
      holding,
      gripFrom,
      gripTo,
      freeEnd,
      support,
      heldOn,
    })),
    operations: route.operations.map(({ toolItem: _toolItem, notes, ...operation }) => ({
      ...operation,
      features: [...operation.features],
      cut:
        operation.cut &&
        (JSON.parse(JSON.stringify(operation.cut)) as NonNullable<
          DrawResult['route']
        >['operations'][number]['cut']),
      after: operation.after.map((edge) => ({ ...edge })),
      stops: operation.stops.map(({ from, length }) => ({ from, length })),
      target: operation.target.map((target) => ({ ...target })),
      reasons: [...operation.reasons],
      ...(notes ? { notes: [...notes] } : {}),
      cautions: [...operation.cautions],
    })),
    volumes: { ...route.volumes },
    minutes: { ...route.minutes },
    cost: route.cost && { ...route.cost, sums: route.cost.sums.map((sum) => ({ ...sum })) },
  };
}
