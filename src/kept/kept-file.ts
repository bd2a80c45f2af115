// One file beside a draft, too large for local storage. Where the database cannot be opened (private
// windows, old browsers) nothing is kept, and the member chooses the file again.

const database = 'tallyloft';
const store = 'files';

const opened = (): Promise<IDBDatabase | null> =>
  new Promise((resolve) => {
    if (typeof indexedDB === 'undefined') {
      resolve(null);
      return;
    }
    try {
      const opening = indexedDB.open(database, 1);
      opening.onupgradeneeded = () => opening.result.createObjectStore(store);
      opening.onsuccess = () => resolve(opening.result);
      opening.onerror = () => resolve(null);
      opening.onblocked = () => resolve(null);
    } catch {
      resolve(null);
    }
  });

const run = async <Answer>(
  mode: IDBTransactionMode,
  ask: (files: IDBObjectStore) => IDBRequest<Answer>,
): Promise<Answer | null> => {
  const db = await opened();
  if (db === null) return null;
  return new Promise((resolve) => {
    const transaction = db.transaction(store, mode);
    const asked = ask(transaction.objectStore(store));
    const end = (answer: Answer | null) => {
      db.close();
      resolve(answer);
    };
    transaction.oncomplete = () => end(asked.result);
    transaction.onabort = () => end(null);
  });
};

/** The file kept under a name, or null. */
export const readKeptFile = async (name: string): Promise<File | null> => {
  const found: unknown = await run('readonly', (files) => files.get(name));
  return found instanceof File ? found : null;
};

/** Keeps a file under a name; null forgets it. */
export const keepFile = async (name: string, file: File | null): Promise<void> => {
  if (file === null) await run('readwrite', (files) => files.delete(name));
  else await run('readwrite', (files) => files.put(file, name));
};
