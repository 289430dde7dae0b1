import { energisedSections, type SectionTree } from '@lampwright/harness';
import type { Reading } from './types';

/** The sections that were energised in the very same readings: no reading so far tells them apart. */
export interface Kind {
  /** By reading: whether these sections were energised. */
  energised: boolean[];
  /** How many of them can be short at all. */
  members: number;
  /** Sum of their probabilities. */
  sum: number;
  /** Sum of the products of each two of them. */
  pairs: number;
  /** Sum of the products of each three of them. */
  triples: number;
}

/** Sorts the sections into kinds. O(sections x readings). */
export function kindsOf(
  tree: SectionTree,
  readings: readonly Reading[],
): { kinds: Kind[]; kindOf: number[] } {
  const lit = readings.map(({ open }) => energisedSections(tree, open));
  const kinds: Kind[] = [];
  const bySignature = new Map<string, number>();
  const kindOf = tree.sections.map(({ index, probability }) => {
    const energised = lit.map((sections) => sections[index] === true);
    const signature = energised.map(Number).join('');
    const at = bySignature.get(signature) ?? kinds.length;
    const kind = (kinds[at] ??= { energised, members: 0, sum: 0, pairs: 0, triples: 0 });
    bySignature.set(signature, at);
    if (probability > 0) kind.members += 1;
    kind.triples += kind.pairs * probability;
    kind.pairs += kind.sum * probability;
    kind.sum += probability;
    return at;
  });
  return { kinds, kindOf };
}
