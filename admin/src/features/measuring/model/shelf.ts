/** A place on this device that outlives the page. */
export interface Shelf<T> {
  read(): T | null;
  write(value: T): void;
}

/**
 * A shelf in localStorage. It writes before it returns, which is what "kept" means here. Where the device refuses
 * (private window, full), memory stands in, so that at least this page forgets nothing.
 */
export function deviceShelf<T>(key: string, isValid: (value: unknown) => value is T): Shelf<T> {
  let memory: { value: T } | null = null;
  return {
    read() {
      if (memory) return memory.value;
      try {
        const value: unknown = JSON.parse(localStorage.getItem(key) ?? 'null');
        return isValid(value) ? value : null;
      } catch {
        return null;
      }
    },
    write(value) {
      try {
        localStorage.setItem(key, JSON.stringify(value));
        memory = null;
      } catch {
        memory = { value };
      }
    },
  };
}

export const outboxKey = (sheetId: string) => `ellwand.outbox.${sheetId}`;
export const draftsKey = (sheetId: string) => `ellwand.drafts.${sheetId}`;

/** Names this device among others, so that two readings of one point can be told apart. */
export function deviceName(): string {
  const key = 'ellwand.device';
  try {
    const known = localStorage.getItem(key);
    if (known) return known;
    const made = `Tablet ${Math.random().toString(36).slice(2, 6)}`;
    localStorage.setItem(key, made);
    return made;
  } catch {
    return 'Tablet';
  }
}
