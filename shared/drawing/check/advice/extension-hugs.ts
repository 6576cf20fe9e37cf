import { boxesMeet } from '../../geometry/box';
import { sideBySide } from '../../geometry/segment';
import { finding, ofRole, strokesOfKind } from '../reading';
import type { CheckRule } from '../reading';

const APART = 1.2;
const LENGTH = 4;

/** An extension line does not run along an outline. */
export const extensionHugs: CheckRule = {
  id: 'extension-hugs',
  check: (reading) => {
    const outlines = ofRole(reading, 'view').flatMap((v) => strokesOfKind(v, 'visible'));
    return ofRole(reading, 'dimension').flatMap((size) =>
      strokesOfKind(size, 'extension').some((s) =>
        outlines.some((o) => boxesMeet(s.box, o.box, APART) && sideBySide(s, o, APART) > LENGTH),
      )
        ? [finding('extension-hugs', `An extension line of ${size.name} runs along an outline.`, [size.name])]
        : [],
    );
  },
};
