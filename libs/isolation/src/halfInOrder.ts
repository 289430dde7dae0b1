import type { Policy } from './playOut';

/**
 * Opens whatever parts the first half of what is in question, in the order of the tree, from the rest: many points at
 * once on a hub, and so as few power-ups as there can be. Dear to do and cheap to think through:
 * O(cells x log cells) for a whole play where the other plays of a hub take O(cells^2).
 */
export const halfInOrder: Policy = (bench, situation) => {
  const { parent, weight } = bench.cells;
  const later = new Set<number>();
  const open: number[] = [];
  let before = 0;
  for (const v of situation.cells) {
    const suspect = (weight[v] ?? 0) > 0;
    if (2 * (before + (suspect ? 1 : 0)) > situation.count && before > 0) {
      later.add(v);
      // Parents come first, so what hangs on the later half is in it.
      if (!later.has(parent[v] ?? -1)) open.push(v);
    } else if (suspect) before += 1;
  }
  const step = bench.step(situation, open);
  if (!step) throw new Error('two cells in question that no point parts');
  return step;
};
