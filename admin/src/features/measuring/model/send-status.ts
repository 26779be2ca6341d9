import { timeText } from '../../../lib/moments.js';
import type { OutboxView } from './outbox.js';

const readings = (count: number) => (count === 1 ? '1 reading' : `${count} readings`);

/** One of four sentences about where the readings are; empty on a sheet that has none. */
export function sendStatus(view: OutboxView, drafts: number, lastReceived: string | null): string {
  if (view.unkept > 0) return 'Not kept yet: leave this page open';
  const decisions = view.entries.filter(({ state }) => state === 'decision').length;
  const waiting = view.entries.length - decisions;
  if (waiting > 0 && view.sending > 0) return `Sending ${readings(view.sending)}`;
  if (waiting > 0) return 'Kept on this tablet';
  if (decisions > 0)
    return decisions === 1 ? '1 reading needs your decision' : `${decisions} readings need your decision`;
  if (drafts > 0) return 'Kept on this tablet';
  const sent = view.sentAt ?? lastReceived;
  return sent === null ? '' : `All readings sent, ${timeText(sent)}`;
}
