import { useEffect, useState } from 'react';

/** Long enough for the disk to answer and the screen to be drawn, too short to be waited for. */
const SETTLES_MS = 60;

/**
 * A value once it has stood still for a moment; null until the first has. For what is costly to work out and must not
 * stand between a key that was pressed and the disk.
 */
export function useSettled<T>(value: T): T | null {
  const [settled, setSettled] = useState<{ readonly value: T } | null>(null);
  useEffect(() => {
    const timer = setTimeout(() => setSettled({ value }), SETTLES_MS);
    return () => clearTimeout(timer);
  }, [value]);
  return settled && settled.value;
}
