import { createStore, del, get, keys, set, update, type UseStore } from 'idb-keyval';

/** Nothing could be kept on this device: storage is shut off, full, or gone for good. */
export class StorageError extends Error {
  override readonly name = 'StorageError';

  /** True where the disk is full. */
  readonly full: boolean;

  constructor(cause: unknown) {
    super('This device did not keep the data.', { cause });
    this.full = cause instanceof DOMException && cause.name === 'QuotaExceededError';
  }
}

let handle: UseStore | null = null;

function open(): UseStore {
  handle ??= createStore('lampwright', 'kept');
  return handle;
}

/**
 * Runs one piece of work on the store. Browsers cut the connection of an app that was in the background, and every
 * later try on the same handle fails too; so the handle is dropped and the work tried once on a new one.
 */
async function withStore<T>(work: (store: UseStore) => Promise<T>): Promise<T> {
  try {
    return await work(open());
  } catch (error) {
    if (error instanceof DOMException && error.name === 'QuotaExceededError') {
      throw new StorageError(error);
    }
    handle = null;
  }
  try {
    return await work(open());
  } catch (error) {
    handle = null;
    throw new StorageError(error);
  }
}

/**
 * What this device keeps between visits: the one owner of the browser's database. Values are what structured clone
 * takes; what comes back is `unknown`, because an older version of the program may have written it.
 * Every function throws `StorageError`.
 */
export const storage = {
  read: (key: string): Promise<unknown> => withStore((store) => get<unknown>(key, store)),
  write: (key: string, value: unknown): Promise<void> =>
    withStore((store) => set(key, value, store)),
  /** Reads and writes in one transaction, so that two tabs do not overwrite each other. */
  update: (key: string, change: (old: unknown) => unknown): Promise<void> =>
    withStore((store) => update<unknown>(key, change, store)),
  remove: (key: string): Promise<void> => withStore((store) => del(key, store)),
  /** The keys that start with `prefix`. */
  keys: async (prefix: string): Promise<string[]> => {
    const all = await withStore((store) => keys(store));
    return all.filter((key): key is string => typeof key === 'string' && key.startsWith(prefix));
  },
};
