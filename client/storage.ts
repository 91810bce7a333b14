import { createStore, del, get, keys, set, update } from 'idb-keyval';

/** Small things kept on this device. Never tokens. */
export interface Storage {
  get: (key: string) => Promise<unknown>;
  set: (key: string, value: unknown) => Promise<void>;
  remove: (key: string) => Promise<void>;
  keysFrom: (prefix: string) => Promise<string[]>;
  /** Reads and writes in one step, also against other tabs. */
  update: <Value>(key: string, change: (old: unknown) => Value) => Promise<void>;
}

export function memoryStorage(): Storage {
  const kept = new Map<string, unknown>();
  return {
    get: async (key) => kept.get(key),
    set: async (key, value) => void kept.set(key, structuredClone(value)),
    remove: async (key) => void kept.delete(key),
    keysFrom: async (prefix) => [...kept.keys()].filter((key) => key.startsWith(prefix)),
    update: async (key, change) => void kept.set(key, structuredClone(change(kept.get(key)))),
  };
}

function browserStorage(): Storage {
  const store = createStore('locant', 'kept');
  return {
    get: (key) => get(key, store),
    set: (key, value) => set(key, value, store),
    remove: (key) => del(key, store),
    keysFrom: async (prefix) =>
      (await keys<IDBValidKey>(store))
        .filter((key) => typeof key === 'string')
        .filter((key) => key.startsWith(prefix)),
    update: (key, change) => update(key, change, store),
  };
}

/** The browser's own store; memory alone where it has none or refuses, as some private windows do. */
export function openStorage(): Storage {
  let chosen: Promise<Storage> | null = null;
  const choose = async (): Promise<Storage> => {
    if (typeof indexedDB === 'undefined') return memoryStorage();
    try {
      const storage = browserStorage();
      await storage.set('probe', true);
      return storage;
    } catch {
      return memoryStorage();
    }
  };
  const storage = () => (chosen ??= choose());
  return {
    get: async (key) => (await storage()).get(key),
    set: async (key, value) => (await storage()).set(key, value),
    remove: async (key) => (await storage()).remove(key),
    keysFrom: async (prefix) => (await storage()).keysFrom(prefix),
    update: async (key, change) => (await storage()).update(key, change),
  };
}

export const storage = openStorage();
