import type { Instrument } from '../register';

/** Measuring tools of the invented depot; permissible errors are what such instruments usually carry. */
const micrometers: readonly Instrument[] = [0, 25, 50, 75].map((minimum, k) => ({
  id: `micrometer-${minimum}`,
  name: `Micrometer ${minimum}–${minimum + 25}`,
  place: `inst. ${7 + k}`,
  kind: 'micrometer',
  minimum,
  maximum: minimum + 25,
  permissibleError: k < 2 ? 0.004 : 0.005,
}));

const fine: readonly Instrument[] = [0, 25, 50, 75].map((minimum, k) => ({
  id: `micrometer-fine-${minimum}`,
  name: `Micrometer ${minimum}–${minimum + 25}, reading 0.001`,
  place: `inst. ${14 + k}`,
  kind: 'micrometer',
  minimum,
  maximum: minimum + 25,
  permissibleError: 0.002,
}));

const RING_GAUGES = ['M6', 'M8', 'M10', 'M12', 'M16', '1/2-13 UNC'];

const gauges: readonly Instrument[] = RING_GAUGES.map((designation, k) => ({
  id: `ring-${k + 1}`,
  name: `Ring gauge pair ${designation}`,
  place: `inst. ${24 + k}`,
  kind: 'ring-gauge',
  minimum: 0,
  maximum: 100,
  permissibleError: 0.005,
  designation,
}));

export const INSTRUMENTS: readonly Instrument[] = [
  { id: 'rule-1', name: 'Steel rule 300', place: 'inst. 1', kind: 'rule', minimum: 0, maximum: 300, permissibleError: 0.1 },
  { id: 'caliper-1', name: 'Caliper 150', place: 'inst. 2', kind: 'caliper', minimum: 0, maximum: 150, permissibleError: 0.03 },
  { id: 'caliper-2', name: 'Caliper 500', place: 'inst. 3', kind: 'caliper', minimum: 0, maximum: 500, permissibleError: 0.05 },
  { id: 'depth-1', name: 'Depth micrometer 0–150', place: 'inst. 5', kind: 'depth', minimum: 0, maximum: 150, permissibleError: 0.005 },
  ...micrometers,
  ...fine,
  { id: 'dial-1', name: 'Dial indicator 0.01 on stand', place: 'inst. 4', kind: 'dial', minimum: 0, maximum: 10, permissibleError: 0.01 },
  { id: 'protractor-1', name: 'Bevel protractor', place: 'inst. 12', kind: 'protractor', minimum: 0, maximum: 180, permissibleError: 0.083 },
  { id: 'wires-1', name: 'Thread wires, set', place: 'inst. 13', kind: 'thread-wires', minimum: 0, maximum: 60, permissibleError: 0.005 },
  { id: 'radius-1', name: 'Radius gauges 1–25', place: 'inst. 22', kind: 'radius-gauge', minimum: 1, maximum: 25, permissibleError: 0.05 },
  { id: 'radius-2', name: 'Radius gauges 25–60', place: 'inst. 23', kind: 'radius-gauge', minimum: 25, maximum: 60, permissibleError: 0.05 },
  ...gauges,
]; // prettier-ignore
