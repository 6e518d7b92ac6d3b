/** How this browser keeps what is stored: whether it promised not to clear it, and how much room there is. */
export interface Keeping {
  /** null where the browser makes no such promise to anyone. */
  promised: boolean | null;
  usedBytes: number | null;
  roomBytes: number | null;
}

type StorageManagerLike = Pick<StorageManager, "estimate" | "persist" | "persisted">;

function manager(): Partial<StorageManagerLike> | undefined {
  return typeof navigator === "undefined" ? undefined : navigator.storage;
}

/** Asks the browser how it keeps things; every question may be one that it does not know. */
export async function keepingState(storage = manager()): Promise<Keeping> {
  const promised = storage?.persisted ? storage.persisted().catch(() => null) : null;
  const estimate = storage?.estimate ? storage.estimate().catch(() => null) : null;
  const room = await estimate;
  return {
    promised: await promised,
    usedBytes: room?.usage ?? null,
    roomBytes: room?.quota ?? null,
  };
}

/**
 * Asks the browser to keep what is stored here until a person clears it. Some browsers decide by themselves, some ask
 * the person, so this belongs to a moment that explains it: the first walk, an installation, a tap on a button.
 * @returns whether it is promised, or null where the browser makes no promise
 */
export async function askToKeep(storage = manager()): Promise<boolean | null> {
  try {
    if (!storage?.persist) return null;
    return (await storage.persisted?.()) || (await storage.persist());
  } catch {
    return null;
  }
}
