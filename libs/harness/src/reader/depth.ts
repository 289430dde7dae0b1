/** No plan, however much the format grows, nests deeper than this. */
export const DEPTH_LIMIT = 64;

/**
 * Whether a value nests deeper than `DEPTH_LIMIT`: deep enough, and whoever writes it out again runs out of stack. Goes
 * level by level, each object once a level, so that neither depth nor a cycle can hurt. O(size) for what JSON can say.
 */
export function isTooDeep(value: unknown): boolean {
  let level = new Set<object>(isObject(value) ? [value] : []);
  for (let depth = 0; depth <= DEPTH_LIMIT; depth++) {
    const next = new Set<object>();
    for (const outer of level) {
      for (const inner of Object.values(outer)) if (isObject(inner)) next.add(inner);
    }
    if (next.size === 0) return false;
    level = next;
  }
  return true;
}

function isObject(value: unknown): value is object {
  return typeof value === 'object' && value !== null;
}
