import { promisifyRequest, type UseStore } from "idb-keyval";

const SHELF = "kept";

/**
 * The phone's own store, in the form idb-keyval takes. Every transaction is strict: it counts as done when the
 * bytes are on the disk, which the browser's default does not wait for; a write that resolved is saved.
 * The connection is let go when another tab wants to upgrade, and taken up again when it was closed under us.
 * @param name of the database
 * @param closed called when the connection was closed under us: the database was deleted, or the site data cleared
 */
export function openStore(name = "hookfast", closed: () => void = () => {}): UseStore {
  let opening: Promise<IDBDatabase> | null = null;

  function connection(): Promise<IDBDatabase> {
    opening ??= connect(name, () => (opening = null), closed);
    return opening;
  }

  async function transact<T>(
    mode: IDBTransactionMode,
    work: (shelf: IDBObjectStore) => T | PromiseLike<T>,
  ): Promise<T> {
    const db = await connection();
    const transaction = db.transaction(SHELF, mode, { durability: "strict" });
    // Listeners, for idb-keyval's own calls take the transaction's `oncomplete` for themselves.
    const done = new Promise<void>((resolve, reject) => {
      transaction.addEventListener("complete", () => resolve());
      transaction.addEventListener("abort", () => reject(transaction.error));
    });
    try {
      const result = await work(transaction.objectStore(SHELF));
      await done;
      return result;
    } catch (error) {
      done.catch(() => {});
      try {
        transaction.abort();
      } catch {
        // It had ended already.
      }
      throw error;
    }
  }

  return async (mode, work) => {
    try {
      return await transact(mode, work);
    } catch (error) {
      if (!(error instanceof DOMException && error.name === "InvalidStateError")) throw error;
      opening = null;
      return transact(mode, work);
    }
  };
}

function connect(name: string, gone: () => void, closed: () => void): Promise<IDBDatabase> {
  const request = indexedDB.open(name, 1);
  request.onupgradeneeded = () => request.result.createObjectStore(SHELF);
  return promisifyRequest(request).then(
    (db) => {
      db.onversionchange = () => {
        db.close();
        gone();
        closed();
      };
      db.onclose = () => {
        gone();
        closed();
      };
      return db;
    },
    (error) => {
      gone();
      throw error;
    },
  );
}
