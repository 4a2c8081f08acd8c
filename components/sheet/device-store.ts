import { delMany, entries, setMany, type UseStore } from 'idb-keyval';
import type { LoggedOperation } from './operation-log';

/** Where changes wait on the device. Everything can fail: a full disk, a browser that keeps nothing. */
export interface DeviceStore {
  load(): Promise<LoggedOperation[]>;
  /** Resolves when the changes are on the disk, as far as the browser can promise it. */
  write(changed: readonly LoggedOperation[], removed: readonly string[]): Promise<void>;
}

const databaseName = 'witnessmark-readings';
const storeName = 'operations';

/** `strict`: done means written to the disk, not to a cache that a flat battery takes along. */
function strictStore(): UseStore {
  let opening: Promise<IDBDatabase> | undefined;
  const open = () =>
    new Promise<IDBDatabase>((resolve, reject) => {
      const request = indexedDB.open(databaseName, 1);
      request.onupgradeneeded = () => request.result.createObjectStore(storeName);
      request.onerror = () => reject(request.error);
      request.onsuccess = () => {
        // The browser may close it (a cleared profile, a newer version in another tab): opened again at the next use.
        request.result.onclose = () => {
          opening = undefined;
        };
        resolve(request.result);
      };
    });
  return async (mode, work) => {
    opening ??= open();
    opening.catch(() => {
      opening = undefined;
    });
    const database = await opening;
    return work(database.transaction(storeName, mode, { durability: 'strict' }).objectStore(storeName));
  };
}

/** Changes of one person only: another person on the same tablet neither sees nor sends them. */
export function deviceStore(accountId: string): DeviceStore {
  const store = strictStore();
  const prefix = `${accountId} `;
  return {
    async load() {
      const all = await entries<string, LoggedOperation>(store);
      return all.filter(([key]) => key.startsWith(prefix)).map(([, entry]) => entry);
    },
    async write(changed, removed) {
      if (changed.length > 0) {
        await setMany(
          changed.map((entry): [string, LoggedOperation] => [`${prefix}${entry.operation.opId}`, entry]),
          store,
        );
      }
      if (removed.length > 0) {
        await delMany(
          removed.map((opId) => `${prefix}${opId}`),
          store,
        );
      }
    },
  };
}

export const isFull = (error: unknown) => error instanceof DOMException && error.name === 'QuotaExceededError';
