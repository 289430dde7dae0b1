/** As much of IndexedDB as idb-keyval uses, in memory: one store with `get`, `put`, `delete` and `getAllKeys`. */
interface Request {
  result?: unknown;
  error?: unknown;
  onsuccess?: () => void;
  onerror?: () => void;
  onupgradeneeded?: () => void;
}

let rows = new Map<string, unknown>();
let failures = 0;
let opened = 0;

function answer(result: () => unknown): Request {
  const request: Request = {};
  queueMicrotask(() => {
    request.result = result();
    request.onsuccess?.();
  });
  return request;
}

function store() {
  const transaction: { oncomplete?: () => void } = {};
  const complete = () => setTimeout(() => transaction.oncomplete?.(), 0);
  return {
    transaction,
    get: (key: string) => answer(() => structuredClone(rows.get(key))),
    getAllKeys: () => answer(() => [...rows.keys()]),
    put: (value: unknown, key: string) => {
      rows.set(key, structuredClone(value));
      complete();
    },
    delete: (key: string) => {
      rows.delete(key);
      complete();
    },
  };
}

const database = {
  createObjectStore: () => undefined,
  transaction: () => {
    if (failures > 0) {
      failures -= 1;
      throw new DOMException('The database connection is closing.', 'InvalidStateError');
    }
    return { objectStore: store };
  },
};

export const fakeIndexedDb = {
  factory: {
    open: () => {
      opened += 1;
      const request = answer(() => database);
      queueMicrotask(() => request.onupgradeneeded?.());
      return request;
    },
  },
  rows: () => rows,
  opened: () => opened,
  /** The next `count` transactions throw, as on a connection that the system cut. */
  failNext: (count: number) => {
    failures = count;
  },
  reset: () => {
    rows = new Map();
    failures = 0;
    opened = 0;
  },
};
