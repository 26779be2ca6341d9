import { describe, expect, it } from 'vitest';
import { newId } from '../../../lib/ids.js';
import { MemoryStore } from '../../../offline/memory-store.js';
import { startOffline } from '../../../offline/offline.js';
import type { OutboxEntry, OutboxView } from './outbox.js';
import { SheetOutbox } from './outbox.js';
import { sendStatus } from './send-status.js';

const nothing: OutboxView = { entries: [], notes: [], pictures: [], sending: 0, sentAt: null, unkept: 0 };
const reading: OutboxEntry['reading'] = {
  id: newId(),
  pointId: 'waist',
  round: 1,
  worn: null,
  replaces: null,
  note: '',
  readBy: newId(),
  heldBy: null,
  device: 'Tablet 1',
  keyedAt: '2026-12-01T09:00:00.000Z',
  state: 'not-taken',
  reason: 'absent',
};
const waiting: OutboxEntry = { reading, state: 'waiting' };
const decision: OutboxEntry = { reading, state: 'decision' };
const at = new Date(2026, 11, 1, 14, 32).getTime();

describe('the status says one sentence', () => {
  it.each<[string, Partial<OutboxView>, number, string | null]>([
    ['Kept on this tablet', { entries: [waiting] }, 0, null],
    ['Sending 1 reading', { entries: [waiting], sending: 1 }, 0, null],
    ['Kept on this tablet', {}, 1, null],
    ['All readings sent, 14:32', { sentAt: at }, 0, null],
    ['1 reading needs your decision', { entries: [decision] }, 0, null],
    ['Not kept yet: leave this page open', { entries: [waiting], unkept: 1 }, 0, null],
    ['', {}, 0, null],
  ])('%s', (sentence, view, drafts, received) => {
    expect(sendStatus({ ...nothing, ...view }, drafts, received)).toBe(sentence);
  });
});

describe('a sheet’s own outbox', () => {
  it('shows what waits of this sheet alone, and keeps its view while nothing changes', async () => {
    const { outbox, drafts, ready, close } = startOffline(new MemoryStore());
    await ready;
    const keeper = { id: newId(), name: 'Odile Marsh' };
    const [bodice, skirt] = [newId(), newId()].map((id) => new SheetOutbox(outbox, drafts, id, keeper));
    await bodice!.add(reading);
    await bodice!.say({ about: 'described', thing: 'label', text: 'Woven: Verrault' });
    expect(bodice!.snapshot().entries).toEqual([{ reading, state: 'waiting' }]);
    expect(bodice!.snapshot().notes).toMatchObject([
      { note: { about: 'described', text: 'Woven: Verrault' } },
    ]);
    expect(bodice!.snapshot()).toBe(bodice!.snapshot());
    expect(skirt!.snapshot().entries).toEqual([]);
    close();
  });
});
