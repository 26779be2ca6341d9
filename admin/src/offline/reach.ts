type Listener = () => void;

/**
 * Whether the museum's server can be reached. The browser's own `navigator.onLine` says only that some network is
 * there, so what counts is whether our API answered when it was asked last; a heartbeat asks every half minute.
 */
export class Reach {
  private silent = false;
  private readonly listeners = new Set<Listener>();

  /** Any answer counts, a refusal too. */
  answered(): void {
    this.set(false);
  }

  unanswered(): void {
    this.set(true);
  }

  readonly isSilent = (): boolean => this.silent;

  readonly subscribe = (listener: Listener): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  private set(silent: boolean): void {
    if (this.silent === silent) return;
    this.silent = silent;
    for (const listener of this.listeners) listener();
  }
}

export const reach = new Reach();
