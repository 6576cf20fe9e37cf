import type { Constraint, Derived, Remark } from '../shared/template/template';

/** Stations from the left face, and what the end and the flats come to. */
export const TAPERED_HANDLE_DERIVED: readonly Derived[] = [
  { id: 'major', value: 'majorOf(thread)' },
  { id: 'threadLeg', value: 'given(threadChamfer) ? threadChamfer : pitchOf(thread)' },
  { id: 'spigot', value: 'either(spigotLength, 0)' },
  { id: 'gripFrom', value: 'threadLength + spigot' },
  { id: 'gripTo', value: 'gripFrom + gripLength' },
  { id: 'overall', value: 'gripTo + taperLength' },
  { id: 'isHex', value: 'grip == "hex"' },
  { id: 'flatsSpan', value: '(given(flatsLength) ? flatsLength > 0 : false) ? flatsLength : gripLength' },
  { id: 'slope', value: '(barDiameter - taperEndDiameter) / 2 / taperLength' },
  // Where the taper has come down to the flats, measured from the left end of the grip.
  { id: 'flatsRunOut', value: 'gripLength + (barDiameter - acrossFlats) / 2 / slope' },
  // Flats end by themselves where the taper meets them, and run on to there when they are said to end with the grip.
  {
    id: 'flatsEndIsGiven',
    value: 'isHex ? (abs(flatsSpan - gripLength) > 1e-6 and flatsSpan < flatsRunOut - 1e-6) : false',
  },
  { id: 'flatsStop', value: 'flatsEndIsGiven ? flatsSpan : flatsRunOut' },
  { id: 'cornersSharp', value: 'acrossFlats / cos(pi / 6) < barDiameter - 1e-6' },
  { id: 'end', value: 'either(endSize, 0)' },
  { id: 'crowned', value: 'endForm == "crown" and end > 0' },
  { id: 'chamfered', value: 'endForm == "chamfer" and end > 0' },
  // A sphere centred on the axis reaches a cone that widens away from the end only from this radius on.
  { id: 'crownLeast', value: 'taperEndDiameter / 2 * (slope + sqrt(1 + slope ^ 2))' },
  { id: 'crownReach', value: 'end - taperEndDiameter / 2 * slope' },
  {
    id: 'crownDepth',
    value:
      '(crownReach - sqrt(max(0, crownReach ^ 2 - (1 + slope ^ 2) * (taperEndDiameter / 2) ^ 2))) / (1 + slope ^ 2)',
  },
  { id: 'endDepth', value: 'crowned ? crownDepth : (chamfered ? end : 0)' },
];

export const TAPERED_HANDLE_CONSTRAINTS: readonly Constraint[] = [
  {
    parameter: 'thread',
    holds: 'major >= 1 and major <= 500',
    message: '{#thread} has a diameter of {major}. Give a thread of {range:1|500}.',
  },
  {
    parameter: 'thread',
    when: 'spigot > 0',
    holds: 'major <= spigotDiameter + 1e-6',
    message:
      '{#thread} has a diameter of {major}, larger than the spigot of {spigotDiameter} behind it. Give a smaller thread or a larger spigot.',
  },
  {
    parameter: 'thread',
    when: 'spigot == 0',
    holds: 'major < barDiameter',
    message:
      '{#thread} has a diameter of {major}, and the bar has {barDiameter}. Give a thread smaller than the bar.',
  },
  {
    parameter: 'threadChamfer',
    when: 'threadLeg > 0',
    holds: 'threadLeg <= min(threadLength, major / 2) - 0.1',
    message:
      'A chamfer of {threadLeg} leaves nothing of a thread {major} across and {threadLength} long. Give {<=min(threadLength, major / 2) - 0.1} or less, or 0 for none.',
  },
  {
    parameter: 'spigotDiameter',
    when: 'spigot > 0',
    holds: 'spigotDiameter < barDiameter - 1e-6',
    message:
      'A spigot of {spigotDiameter} cannot be turned from a bar of {barDiameter}. Give a spigot smaller than the bar, or a larger bar.',
  },
  {
    parameter: 'acrossFlats',
    when: 'isHex',
    holds: 'acrossFlats <= barDiameter - 0.05',
    message:
      'Flats {acrossFlats} apart leave no flat on a bar of {barDiameter}. Give {<=barDiameter - 0.05} or less across flats, or a larger bar.',
  },
  {
    parameter: 'acrossFlats',
    when: 'isHex',
    holds: 'acrossFlats >= barDiameter * 0.7',
    message:
      'Flats {acrossFlats} apart are deeper than a bar of {barDiameter} allows. Give {>=barDiameter * 0.7} or more across flats, or a smaller bar.',
  },
  {
    parameter: 'acrossFlats',
    when: 'isHex and spigot > 0 and spigotDiameter < barDiameter',
    holds: 'acrossFlats >= spigotDiameter',
    message:
      'Flats {acrossFlats} apart would cut into the spigot of {spigotDiameter}. Give {>=spigotDiameter} or more across flats, or a smaller spigot.',
  },
  {
    parameter: 'acrossFlats',
    when: 'isHex and spigot == 0 and major < barDiameter',
    holds: 'acrossFlats >= major',
    message:
      'Flats {acrossFlats} apart would cut into the thread of {major}. Give {>=major} or more across flats, or a smaller thread.',
  },
  {
    parameter: 'taperEndDiameter',
    holds: 'taperEndDiameter < barDiameter - 1e-6',
    message:
      'A taper cannot end at {taperEndDiameter} on a bar of {barDiameter}. Give an end diameter smaller than the bar.',
  },
  {
    parameter: 'taperLength',
    holds: 'slope <= tan(pi / 6) + 1e-9',
    message:
      'A taper from {barDiameter} to {taperEndDiameter} in {taperLength} is steeper than a half angle of 30°. Give a length of {>=(barDiameter - taperEndDiameter) / 2 / tan(pi / 6)} or more, or a larger end.',
  },
  {
    parameter: 'endSize',
    when: 'crowned',
    holds: 'end >= crownLeast - 1e-9',
    message:
      '{endSize} is too small to crown a {taperEndDiameter} end. Give a radius of {range:crownLeast|500}, or choose a chamfer.',
  },
  {
    parameter: 'endSize',
    when: 'chamfered',
    holds: 'end <= taperEndDiameter / 2 - 0.1',
    message:
      'A chamfer of {endSize} is too large for a {taperEndDiameter} end. Give {range:0.1|taperEndDiameter / 2 - 0.1}, or 0 for a plain end.',
  },
  {
    parameter: 'taperLength',
    when: 'end > 0',
    holds: 'endDepth <= taperLength - 0.1',
    message: 'The end takes {endDepth} of a taper {taperLength} long. Give a longer taper or a smaller end.',
  },
  {
    parameter: 'flatsLength',
    when: 'isHex',
    holds: 'flatsSpan <= gripLength + taperLength - endDepth - 0.1',
    message:
      'Flats {flatsSpan} long would reach past the taper. Give {<=gripLength + taperLength - endDepth - 0.1} or less.',
  },
  {
    parameter: 'acrossFlats',
    when: 'isHex and acrossFlats < barDiameter and taperEndDiameter < barDiameter and slope <= tan(pi / 6) and not flatsEndIsGiven',
    holds: 'flatsRunOut <= gripLength + taperLength - endDepth - 0.1',
    message:
      'Flats {acrossFlats} apart would run out through the right end, where the taper is still larger. Give more across flats, a smaller end diameter, or a flats length shorter than the grip.',
  },
  {
    parameter: 'gripLength',
    holds: 'overall <= 3000',
    message: 'The handle comes to {overall}. Keep the whole length to {=3000} or less.',
  },
];

export const TAPERED_HANDLE_REMARKS: readonly Remark[] = [
  {
    code: 'rounded-corners',
    parameter: 'acrossFlats',
    when: 'isHex and acrossFlats / cos(pi / 6) > barDiameter + 1e-6',
    message:
      'A bar of {barDiameter} leaves the corners of a hexagon {acrossFlats} across flats rounded. Sharp ones need {>=acrossFlats / cos(pi / 6)}.',
  },
];
