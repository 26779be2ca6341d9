import { type RefObject, useEffect, useRef } from 'react';

/**
 * A field that people type in freely and that yet shows what the address says whenever that changes. It is the
 * same element throughout, so that the focus stays where it was. What was typed before the page was taken over
 * from the server stays: only a change of the address writes into the field.
 */
export function useFollowing<Field extends HTMLInputElement | HTMLSelectElement>(
  value: string,
): RefObject<Field | null> {
  const field = useRef<Field>(null);
  useWhenChanged(value, () => {
    if (field.current) field.current.value = value;
  });
  return field;
}

/** The same for a box that is ticked or not. */
export function useFollowingTick(ticked: boolean): RefObject<HTMLInputElement | null> {
  const box = useRef<HTMLInputElement>(null);
  useWhenChanged(ticked, () => {
    if (box.current) box.current.checked = ticked;
  });
  return box;
}

/** Runs `write` after a render with another value than before; never for the first. */
function useWhenChanged<Value>(value: Value, write: () => void): void {
  const shown = useRef(value);
  useEffect(() => {
    if (Object.is(shown.current, value)) return;
    shown.current = value;
    write();
  });
}
