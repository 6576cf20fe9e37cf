import type { Part } from '../part/part';
import { lengthsCompleteness, type Faces } from './completeness-lengths';
import { rankCompleteness } from './completeness-rank';
import type { Completeness, Size } from './scheme';

/** Lengths that the sizes treat as one face: those one diameter or thread size names together. */
export function facesOf(part: Part, sizes: readonly Size[]): Faces {
  const kindOf = new Map(part.features.map(({ id, kind }) => [id, kind]));
  return sizes.flatMap(({ features, kind }) => {
    if (kind !== 'diameter' && kind !== 'thread') return [];
    return (['cylinder', 'thread'] as const)
      .map((wanted) => features.filter((id) => kindOf.get(id) === wanted))
      .filter((face) => face.length > 1);
  });
}

/** Whether the sizes say the part completely and once; names what is missing in words and what is twice by id. */
export function completenessOf(part: Part, sizes: readonly Size[], faces: Faces = facesOf(part, sizes)): Completeness {
  const lengths = lengthsCompleteness(part, sizes, faces);
  const others = rankCompleteness(part, sizes, faces);
  return {
    missing: [...lengths.missing, ...others.missing],
    redundant: [...lengths.redundant, ...others.redundant],
  };
}
