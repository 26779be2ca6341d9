/** What the hand typed, each figure once in the whole drill, so that it can be found again wherever it went. */
export interface Entry {
  readonly point: string;
  readonly figure: string;
}

export interface Reckoning {
  readonly typed: number;
  readonly lost: readonly Entry[];
  readonly doubled: readonly Entry[];
  /** Kept, and typed by nobody. */
  readonly strange: readonly Entry[];
}

const keyOf = ({ point, figure }: Entry) => `${point} ${figure}`;

/** Holds what was typed against what the database has kept. */
export function reckon(typed: readonly Entry[], kept: readonly Entry[]): Reckoning {
  const counts = new Map<string, number>();
  for (const entry of kept) counts.set(keyOf(entry), (counts.get(keyOf(entry)) ?? 0) + 1);
  const known = new Set(typed.map(keyOf));
  return {
    typed: typed.length,
    lost: typed.filter((entry) => !counts.has(keyOf(entry))),
    doubled: typed.filter((entry) => (counts.get(keyOf(entry)) ?? 0) > 1),
    strange: kept.filter((entry) => !known.has(keyOf(entry))),
  };
}
