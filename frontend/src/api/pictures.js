// @ts-check
/** Pictures to trace over, kept in this browser (IndexedDB) and never sent anywhere. */

const STORE = 'pictures';

/** @typedef {{blob: Blob, name: string, at: number[], width: number, turn: number, fade: number}} Picture */

/** @returns {Promise<IDBDatabase>} */
function open() {
  return new Promise((resolve, reject) => {
    const request = indexedDB.open('spanwright', 1);
    request.onupgradeneeded = () => request.result.createObjectStore(STORE);
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });
}

/**
 * @template T
 * @param {IDBTransactionMode} mode @param {(store: IDBObjectStore) => IDBRequest<T>} work
 * @returns {Promise<T>}
 */
async function act(mode, work) {
  const database = await open();
  try {
    return await new Promise((resolve, reject) => {
      const request = work(database.transaction(STORE, mode).objectStore(STORE));
      request.onsuccess = () => resolve(request.result);
      request.onerror = () => reject(request.error);
    });
  } finally {
    database.close();
  }
}

/** @param {string} plot @returns {Promise<Picture|null>} */
export const get = async (plot) => (await act('readonly', (store) => store.get(plot))) ?? null;

/** @param {string} plot @param {Picture} picture @returns {Promise<unknown>} */
export const put = (plot, picture) => act('readwrite', (store) => store.put(picture, plot));

/** @param {string} plot @returns {Promise<unknown>} */
export const drop = (plot) => act('readwrite', (store) => store.delete(plot));
