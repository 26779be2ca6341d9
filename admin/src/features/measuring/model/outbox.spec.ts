import type { NewReading } from '@ellwand/shared/records/sheet';
import fc from 'fast-check';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { NoAnswer, ProblemError } from '../../../lib/problem-error.js';
import { newId } from '../../../lib/ids.js';
import type { ReadingResult } from '../api/send-readings.js';
import { reading as storedReading } from '../../../testing/fake-api/sheets.js';
import { Outbox, type OutboxEntry } from './outbox.js';
import { sendStatus } from './send-status.js';
import { deviceShelf, type Shelf } from './shelf.js';

const keyed = (pointId: string, typed: string, more: Partial<NewReading> = {}): NewReading =>
  ({
    id: newId(),
    pointId,
    round: 1,
    replaces: null,
    note: '',
    readBy: newId(),
    device: 'Tablet 1',
    keyedAt: '2026-12-01T09:00:00.000Z',
    state: 'taken',
    typed,
    unit: 'mm',
    tapeCount: 0,
    levelFoundBy: null,
    ...more,
  }) as NewReading;

const refused = (status: number, code: string) => new ProblemError({ type: 'x', title: code, status, code });

/** A museum's server that keeps readings by id, and a network that may break before or after it has. */
class FarSide {
  readonly kept = new Map<string, NewReading>();
  readonly order: string[] = [];
  weather: ('fair' | 'lost-request' | 'lost-answer' | 'overload')[] = [];
  refusing = new Set<string>();

  readonly deliver = (readings: readonly NewReading[]) => {
    const today = this.weather.shift() ?? 'fair';
    if (today === 'lost-request') return Promise.reject(new NoAnswer('no network'));
    if (today === 'overload') return Promise.reject(refused(503, 'busy'));
    if (readings.some(({ id }) => this.refusing.has(id))) return Promise.reject(refused(422, 'body.invalid'));
    const results = readings.map((reading): ReadingResult => {
      const before = this.kept.has(reading.id);
      if (!before) {
        this.kept.set(reading.id, reading);
        this.order.push(reading.id);
      }
      return {
        id: reading.id,
        outcome: before ? 'already-kept' : 'kept',
        reading: storedReading(1, reading.pointId, '1', { id: reading.id }),
      };
    });
    if (today === 'lost-answer') return Promise.reject(new NoAnswer('the answer was lost'));
    return Promise.resolve({ sheetVersion: 1, results });
  };
}

const isEntries = (value: unknown): value is readonly OutboxEntry[] => Array.isArray(value);
const shelf = () => deviceShelf('ellwand.outbox.test', isEntries);
const open = (far: FarSide, own: Shelf<readonly OutboxEntry[]> = shelf()) =>
  new Outbox({ shelf: own, deliver: far.deliver, onKept: () => undefined, alone: (work) => work() });

describe('the outbox', () => {
  beforeEach(() => localStorage.clear());

  it('loses nothing and doubles nothing, whatever the network does and whenever the page is loaded again', async () => {
    const weather = fc.constantFrom(
      'fair' as const,
      'lost-request' as const,
      'lost-answer' as const,
      'overload' as const,
    );
    const step = fc.oneof(
      { weight: 5, arbitrary: fc.record({ does: fc.constant('key' as const), weather }) },
      { weight: 2, arbitrary: fc.record({ does: fc.constant('load-again' as const), weather }) },
      { weight: 2, arbitrary: fc.record({ does: fc.constant('load-again-at-once' as const), weather }) },
    );
    await fc.assert(
      fc.asyncProperty(fc.array(step, { maxLength: 30 }), async (steps) => {
        localStorage.clear();
        const far = new FarSide();
        let outbox = open(far);
        const typed: string[] = [];
        for (const { does, weather: sky } of steps) {
          far.weather.push(sky);
          if (does === 'key') {
            const reading = keyed('waist', '612');
            typed.push(reading.id);
            outbox.add(reading);
          }
          // A page may be closed in the middle of a sending, so nobody waits for it here.
          else if (does === 'load-again-at-once') outbox = open(far);
          else {
            await outbox.send();
            outbox = open(far);
          }
        }
        far.weather = [];
        await outbox.send();
        await outbox.send();
        expect([...far.kept.keys()].toSorted()).toEqual(typed.toSorted());
        expect(far.order).toHaveLength(typed.length);
        expect(shelf().read() ?? []).toEqual([]);
      }),
      { numRuns: 300 },
    );
  });

  it('is on the shelf before anything else happens', () => {
    const far = new FarSide();
    far.weather = ['lost-request'];
    const reading = keyed('hem', '742', { tapeCount: 3 });
    open(far).add(reading);
    expect(shelf().read()).toEqual([{ reading, state: 'waiting' }]);
  });

  it('keeps the order in which readings were keyed, for a correction must come after what it corrects', async () => {
    const far = new FarSide();
    far.weather = ['lost-request', 'lost-request', 'lost-request'];
    const outbox = open(far);
    const first = keyed('waist', '162');
    const second = keyed('waist', '612', { replaces: first.id });
    outbox.add(first);
    await outbox.send();
    outbox.add(second);
    far.weather = [];
    await outbox.send();
    expect(far.order).toEqual([first.id, second.id]);
  });

  it('does not let one reading that cannot be read hold up the others, nor drops it', async () => {
    const far = new FarSide();
    far.weather = ['lost-request', 'lost-request', 'lost-request'];
    const outbox = open(far);
    const [good, bad, alsoGood] = [keyed('waist', '612'), keyed('bust', '880'), keyed('neck', '372')];
    far.refusing.add(bad.id);
    for (const reading of [good, bad, alsoGood]) outbox.add(reading);
    far.weather = [];
    await outbox.send();
    await outbox.send();
    expect(far.order).toEqual([good.id, alsoGood.id]);
    expect(outbox.snapshot().entries).toEqual([{ reading: bad, state: 'decision', why: 'body.invalid' }]);
  });

  it('shows a conflict with what stands instead, and sends what the person decides', async () => {
    const far = new FarSide();
    const standing = storedReading(9, 'waist', '615');
    const mine = keyed('waist', '612');
    let conflict = true;
    const outbox = new Outbox({
      shelf: shelf(),
      onKept: () => undefined,
      alone: (work) => work(),
      deliver: (readings) => {
        if (!conflict) return far.deliver(readings);
        conflict = false;
        return Promise.resolve({
          sheetVersion: 1,
          results: [{ id: mine.id, outcome: 'conflict', detail: 'Another reading stands.', standing }],
        });
      },
    });
    outbox.add(mine);
    await outbox.send();
    expect(outbox.snapshot().entries).toEqual([
      { reading: mine, state: 'decision', why: 'Another reading stands.', standing },
    ]);
    const again = { ...mine, id: newId(), replaces: standing.id };
    outbox.decide(mine.id, again);
    await outbox.send();
    expect(far.order).toEqual([again.id]);
    expect(outbox.snapshot().entries).toEqual([]);
  });

  it('goes on in memory where the device keeps nothing', () => {
    const refusing = vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('full', 'QuotaExceededError');
    });
    const own = shelf();
    own.write([{ reading: keyed('waist', '612'), state: 'waiting' }]);
    expect(own.read()).toHaveLength(1);
    refusing.mockRestore();
  });
});

describe('the status says one of four sentences', () => {
  const waiting = { reading: keyed('waist', '1'), state: 'waiting' } as const;
  const decision = { reading: keyed('waist', '1'), state: 'decision' } as const;
  const at = new Date(2026, 11, 1, 14, 32).getTime();

  it.each([
    ['Kept on this tablet', { entries: [waiting], sending: 0, sentAt: null }, 0],
    ['Kept on this tablet', { entries: [], sending: 0, sentAt: at }, 1],
    ['Sending 3 readings', { entries: [waiting, waiting, waiting], sending: 3, sentAt: null }, 0],
    ['Sending 1 reading', { entries: [waiting], sending: 1, sentAt: null }, 0],
    ['All readings sent, 14:32', { entries: [], sending: 0, sentAt: at }, 0],
    ['2 readings need your decision', { entries: [decision, decision], sending: 0, sentAt: at }, 0],
    ['1 reading needs your decision', { entries: [decision], sending: 0, sentAt: at }, 2],
  ])('%s', (sentence, view, drafts) => {
    expect(sendStatus(view, drafts, null)).toBe(sentence);
  });

  it('says nothing of a sheet that has no readings', () => {
    expect(sendStatus({ entries: [], sending: 0, sentAt: null }, 0, null)).toBe('');
  });
});
