type Take = () => void;

let ready: Take | null = null;
const listeners = new Set<() => void>();

/** A newer Workroom that lies ready on this device; taking it puts it in the place of this one. */
export const newerWorkroom = {
  subscribe: (listener: () => void): (() => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  snapshot: (): Take | null => ready,
  isReady(take: Take): void {
    ready = take;
    for (const listener of listeners) listener();
  },
};
