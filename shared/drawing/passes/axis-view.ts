/** The axis view on floating paper. Afterwards: outline, edges, threads, breaks and centre line are drawn, true to the body. */
import type { Part } from '../../part/part';
import { axisCentreLine, axisOutline, breakLines } from './axis-outline';
import { faceDivisions, flatsEdges, shoulderEdges, threadMarks } from './axis-edges';
import { footprintOf } from '../footprint';
import type { AxisPaper } from '../layout';
import { profileOf } from '../profile';
import { rulesFor } from '../rules';
import type { Writing } from '../size-text';
import type { XMap } from '../x-map';

/** Draws the part's axis view at the map's scale, axis at y = 0, left face at x = 0. */
export function axisView(part: Part, map: XMap, writing: Writing): AxisPaper {
  const rules = rulesFor(writing.style);
  const profile = profileOf(part.body);
  const outline = axisOutline(profile, map);
  const edges = { body: part.body, map, merge: rules.mergeOutlines };
  const marks = [
    ...outline.marks,
    ...shoulderEdges(profile, edges),
    ...flatsEdges(edges),
    ...threadMarks(edges),
    ...faceDivisions(part, edges),
    ...breakLines(profile, map),
    axisCentreLine(map, rules.centrePast),
  ];
  const reach = Math.max(...outline.top.map((p) => -p.y), ...outline.bottom.map((p) => p.y));
  const last = map.knots[map.knots.length - 1];
  return {
    style: writing.style,
    rules,
    writing,
    map,
    marks,
    print: footprintOf(marks),
    top: outline.top,
    bottom: outline.bottom,
    reach,
    left: 0,
    right: last ? last[1] : 0,
  };
}
