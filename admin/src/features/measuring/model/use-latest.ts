import { useLayoutEffect, useState } from 'react';

type Ways = Readonly<Record<string, (...args: never[]) => unknown>>;

/** Functions that stay the same and do what their newest version does. */
class Latest<W extends Ways> {
  readonly stable: W;

  constructor(private newest: W) {
    const names = Object.keys(newest) as (keyof W)[];
    const callers = names.map((name) => [name, (...args: never[]) => this.newest[name]?.(...args)]);
    this.stable = Object.fromEntries(callers) as W;
  }

  take(newest: W): void {
    this.newest = newest;
  }
}

/**
 * The same functions for as long as the component lives, each doing what its newest version does: for rows that are not
 * drawn anew with every keystroke. To be called by events alone, never while drawing.
 */
export function useLatest<W extends Ways>(ways: W): W {
  const [latest] = useState(() => new Latest(ways));
  useLayoutEffect(() => latest.take(ways));
  return latest.stable;
}
