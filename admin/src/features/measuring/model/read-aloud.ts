import type { NewReading } from '@ellwand/shared/records/sheet';
import { unitLabels } from '@ellwand/shared/units/format-length';
import { useRemembered } from '../../../lib/remembered.js';

export const canReadAloud = (): boolean => 'speechSynthesis' in window;

/** Says each committed reading and what comes next, so that whoever holds the tape need not look up. */
export function useReadAloud(): readonly [boolean, (on: boolean) => void] {
  const [value, set] = useRemembered('read-aloud', ['on', 'off'] as const, 'off');
  return [value === 'on' && canReadAloud(), (on) => set(on ? 'on' : 'off')];
}

/** "Hem, 3 tapes and 742 millimetres". */
export function readingAloud(point: string, reading: NewReading): string {
  if (reading.state === 'not-taken') return `${point}, not taken`;
  const tapes =
    reading.tapeCount > 0 ? `${reading.tapeCount} ${reading.tapeCount === 1 ? 'tape' : 'tapes'} and ` : '';
  return `${point}, ${tapes}${reading.typed} ${unitLabels[reading.unit]}`;
}

export function sayReading(point: string, reading: NewReading): void {
  window.speechSynthesis.cancel();
  window.speechSynthesis.speak(new SpeechSynthesisUtterance(readingAloud(point, reading)));
}

/** After what is being said, not in place of it. */
export function sayNext(point: string): void {
  window.speechSynthesis.speak(new SpeechSynthesisUtterance(`Next: ${point}`));
}
