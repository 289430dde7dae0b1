import type { Section, SectionTree } from '@lampwright/harness';

/** Numbers from 0 to 1 that look random and are the same each time (Park and Miller 1988). */
function sequence(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}

/** A tree of `points` points: `reach` is how far back from the newest section the next one may be hung. */
export function grownTree(points: number, reach: number, seed: number): SectionTree {
  const random = sequence(seed);
  const sections: Section[] = [section(0, null, 0, random)];
  for (let index = 1; index <= points; index += 1) {
    const parent = Math.max(0, index - 1 - Math.floor(random() * reach));
    sections.push(section(index, parent, (16 * index) / points, random));
    sections[parent]?.children.push(index);
  }
  const total = sections.reduce((sum, { weight }) => sum + weight, 0);
  for (const each of sections) each.probability = each.weight / total;
  return { circuit: 'bench', sections };
}

function section(
  index: number,
  parent: number | null,
  along: number,
  random: () => number,
): Section {
  const openSeconds = 10 + Math.floor(random() * 110);
  const closeSeconds = 10 + Math.floor(random() * 70);
  const point = parent === null ? null : { partId: `p${index}`, openSeconds, closeSeconds, along };
  const weight = 0.5 + 3 * random();
  return { index, parent, point, children: [], places: [], weight, probability: 0 };
}
