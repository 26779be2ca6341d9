import { useCallback, useState } from 'react';

/** A small preference of this device. A device that keeps nothing (private window) still works, forgetfully. */
export function readRemembered(key: string): string | null {
  try {
    return localStorage.getItem(`ellwand.${key}`);
  } catch {
    return null;
  }
}

export function remember(key: string, value: string): void {
  try {
    localStorage.setItem(`ellwand.${key}`, value);
  } catch {
    // Nothing to do: the choice holds for this page.
  }
}

/** State that is one of `choices` and is remembered on this device. */
export function useRemembered<T extends string>(
  key: string,
  choices: readonly T[],
  usual: T,
): readonly [T, (value: T) => void] {
  const [value, setValue] = useState<T>(() => choices.find((one) => one === readRemembered(key)) ?? usual);
  const choose = useCallback(
    (next: T) => {
      remember(key, next);
      setValue(next);
    },
    [key],
  );
  return [value, choose];
}
