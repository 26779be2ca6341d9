import { type RefObject, useEffect, useRef } from 'react';

/**
 * A field that people type in freely and that yet shows what the address says whenever that changes. It is the
 * same element throughout, so that the focus stays where it was.
 */
export function useFollowing<Field extends HTMLInputElement | HTMLSelectElement>(
  value: string,
): RefObject<Field | null> {
  const field = useRef<Field>(null);
  useEffect(() => {
    if (field.current) field.current.value = value;
  }, [value]);
  return field;
}

/** The same for a box that is ticked or not. */
export function useFollowingTick(ticked: boolean): RefObject<HTMLInputElement | null> {
  const box = useRef<HTMLInputElement>(null);
  useEffect(() => {
    if (box.current) box.current.checked = ticked;
  }, [ticked]);
  return box;
}
