import type { Odds } from './Odds';
import type { Standing } from './standing';

/** Sections that no point in reach parts, and the probability that any of them holds a short. */
export interface Suspect {
  /** Most likely first. */
  sections: number[];
  probability: number;
}

/** The most likely place to name: one section, or several that barred points join. O(sections x joined groups). */
export function likeliest(standing: Standing, odds: Odds): Suspect {
  const { belief, tree, hunt } = standing;
  const joined = groups(standing);
  const bestAt = belief.inQuestion[0] ?? 0;
  let best: Suspect = { sections: [], probability: 0 };
  for (const sections of joined.values()) {
    const [first] = sections;
    if (first === undefined) continue;
    const one = belief.probabilities[first] ?? 0;
    // Without barred points only the likeliest section can be it.
    if (sections.length === 1 && (one <= best.probability || (!hunt.barred && first !== bestAt)))
      continue;
    const inGroup = new Set(sections);
    const probability =
      sections.length === 1 ? one : odds.lit(tree.sections.map(({ index }) => inGroup.has(index)));
    if (probability > best.probability) best = { sections, probability };
  }
  return best;
}

/** The sections in question, most likely first, by the section in which the nearest movable point ends. */
function groups({ belief, tree, hunt }: Standing): Map<number, number[]> {
  const open = new Set(hunt.open);
  const barred = new Set((hunt.barred ?? []).filter((id) => !open.has(id)));
  const home: number[] = [];
  for (const { index, parent, point } of tree.sections) {
    const joins = parent !== null && point !== null && barred.has(point.partId);
    home.push(joins ? (home[parent] ?? 0) : index);
  }
  const joined = new Map<number, number[]>();
  for (const index of belief.inQuestion) {
    const at = home[index] ?? index;
    joined.set(at, [...(joined.get(at) ?? []), index]);
  }
  return joined;
}
