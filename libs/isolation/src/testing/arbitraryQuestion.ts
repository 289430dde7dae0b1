import fc from 'fast-check';
import { pointsOf } from '../costs';
import { DEFAULT_TIMING } from '../timing';
import type { Question, Timing } from '../types';
import { treeOf } from './trees';

interface Limits {
  points: number;
  /** Whether points may be open at the start. Default true. */
  opened?: boolean;
}

/** Questions of all kinds: zeros in any pattern, points open or not, power at hand or not, dear overloads or none. */
export function arbitraryQuestion({ points, opened = true }: Limits): fc.Arbitrary<Question> {
  const section = fc.record({
    up: fc.nat(),
    weight: fc.oneof(fc.constant(0), fc.integer({ min: 1, max: 9 })),
    openSeconds: fc.integer({ min: 0, max: 60 }),
    closeSeconds: fc.integer({ min: 0, max: 60 }),
    along: fc.integer({ min: 0, max: 12 }),
    isOpen: fc.boolean(),
  });
  return fc
    .tuple(fc.array(section, { minLength: 2, maxLength: points + 1 }), arbitraryTiming())
    .filter(([sections]) => sections.filter(({ weight }) => weight > 0).length > 1)
    .map(([sections, timing]) => {
      const parents = sections.map(({ up }, at) => (at === 0 ? -1 : up % at));
      const tree = treeOf(parents, (at) => sections[at] ?? {});
      const open = opened
        ? pointsOf(tree).flatMap(({ partId }, at) => (sections[at + 1]?.isOpen ? [partId] : []))
        : [];
      // What was powered last is left out of it: any set of points may be proposed.
      const probabilities = tree.sections.map(({ probability }) => probability);
      return { tree, probabilities, open, timing, poweredWith: ['none'] };
    });
}

function arbitraryTiming(): fc.Arbitrary<Timing> {
  return fc.record({
    powerSeconds: fc.constantFrom(1, 15, 60),
    walkSecondsPerMetre: fc.constantFrom(0, 1, 4),
    powerAlong: fc.constantFrom(DEFAULT_TIMING.powerAlong, 6),
    overloadSeconds: fc.constantFrom(0, 40),
  });
}
