import type { Keeper } from '../store/outbox';

/** A store in memory, with what it keeps open to the test. */
export function memoryKeeper(kept = new Map<string, unknown>()): Keeper & {
  kept: Map<string, unknown>;
} {
  return {
    kept,
    read: async (key) => structuredClone(kept.get(key)),
    write: async (key, value) => void kept.set(key, structuredClone(value)),
    update: async (key, change) =>
      void kept.set(key, structuredClone(change(structuredClone(kept.get(key))))),
    remove: async (key) => void kept.delete(key),
  };
}
