import { useState } from 'react';
import { useRemembered } from '../../../lib/remembered.js';

export type RowBox = 'count' | 'text';

/** The sheet's own big keypad, and which of the row's boxes its keys go to. */
export function useKeypad() {
  const [shown, setShown] = useRemembered('keypad', ['on', 'off'] as const, 'off');
  const [box, setBox] = useState<RowBox>('text');
  return { keypad: shown === 'on', setKeypad: (on: boolean) => setShown(on ? 'on' : 'off'), box, setBox };
}
