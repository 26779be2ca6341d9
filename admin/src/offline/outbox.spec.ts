import 'fake-indexeddb/auto';
import type { NewReading } from '@ellwand/shared/records/sheet';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { newId } from '../lib/ids.js';
import { NoAnswer, ProblemError } from '../lib/problem-error.js';
import { reading as storedReading } from '../testing/fake-api/sheets.js';
import { type Database, openDatabase } from './database.js';
import { MemoryStore } from './memory-store.js';
import type { Operation, OperationOf } from './operation.js';
import { type Deliver, DeviceOutbox, type Outcome } from './outbox.js';
import { DatabaseStore, type OfflineStore } from './store.js';

const odile = newId();
const [bodice, skirt] = [newId(), newId()];

const keyed = (sheetId = bodice, more: Partial<NewReading> = {}, by = odile): OperationOf<'reading'> => {
  const reading = {
    id: newId(),
    pointId: 'waist',
    round: 1,
    worn: null,
    replaces: null,
    note: '',
    readBy: by,
    heldBy: null,
    device: 'Tablet 1',
    keyedAt: '2026-12-01T09:00:00.000Z',
    state: 'taken',
    typed: '612',
    unit: 'mm',
    tapeCount: 0,
    gapTyped: null,
    method: null,
    depthTyped: null,
    levelFoundBy: null,
    ...more,
  } as NewReading;
  return { id: reading.id, sheetId, by, byName: 'Odile Marsh', state: 'waiting', kind: 'reading', reading };
};

const refused = (status: number, code: string) => new ProblemError({ type: 'x', title: code, status, code });

type Sky = 'fair' | 'lost-request' | 'lost-answer' | 'overload';

/** A museum's server that keeps operations by id, and a network that may break before or after it has. */
class FarSide {
  readonly kept = new Map<string, Operation>();
  readonly order: string[] = [];
  weather: Sky[] = [];
  refusing = new Set<string>();

  readonly deliver: Deliver = (batch) => {
    const today = this.weather.shift() ?? 'fair';
    if (today === 'lost-request') return Promise.reject(new NoAnswer('no network'));
    if (today === 'overload') return Promise.reject(refused(503, 'busy'));
    if (batch.some(({ id }) => this.refusing.has(id))) return Promise.reject(refused(422, 'body.invalid'));
    const outcomes = batch.map((operation): Outcome => {
      if (!this.kept.has(operation.id)) this.order.push(operation.id);
      this.kept.set(operation.id, operation);
      return { id: operation.id, kept: true };
    });
    if (today === 'lost-answer') return Promise.reject(new NoAnswer('the answer was lost'));
    return Promise.resolve(outcomes);
  };
}

const open = async (far: { readonly deliver: Deliver }, store: OfflineStore, user: string | null = odile) => {
  const outbox = new DeviceOutbox({
    store,
    deliver: far.deliver,
    alone: (work) => work(),
    tell: () => undefined,
    later: () => undefined,
  });
  await outbox.reread();
  outbox.signedIn(user);
  return outbox;
};

let databases = 0;
const freshDatabase = (): Promise<Database> => openDatabase(`device ${databases++}`);
const idsIn = async (store: OfflineStore) => (await store.operations()).map(({ operation }) => operation.id);

describe('the outbox of this device', () => {
  it('loses nothing and doubles nothing, whatever the network does and whenever a page is closed', async () => {
    const weather = fc.constantFrom<Sky>('fair', 'lost-request', 'lost-answer', 'overload');
    const step = fc.oneof(
      { weight: 5, arbitrary: fc.record({ does: fc.constantFrom('key', 'key-skirt'), weather }) },
      { weight: 2, arbitrary: fc.record({ does: fc.constant('load-again'), weather }) },
      { weight: 2, arbitrary: fc.record({ does: fc.constant('close-at-once'), weather }) },
      { weight: 2, arbitrary: fc.record({ does: fc.constant('second-tab'), weather }) },
    );
    await fc.assert(
      fc.asyncProperty(fc.array(step, { maxLength: 30 }), async (steps) => {
        const database = await freshDatabase();
        const store = new DatabaseStore(database);
        const far = new FarSide();
        let outbox = await open(far, store);
        const typed: string[] = [];
        for (const { does, weather: sky } of steps) {
          far.weather.push(sky);
          if (does.startsWith('key')) {
            const operation = keyed(does === 'key' ? bodice : skirt);
            typed.push(operation.id);
            await outbox.add({ operation });
          } else if (does === 'load-again') {
            await outbox.send();
            outbox = await open(far, store);
            // A page may be closed in the middle of a sending, and another tab may send beside: nobody waits for them.
          } else if (does === 'close-at-once') outbox = await open(far, store);
          else void (await open(far, store)).send();
        }
        far.weather = [];
        await outbox.send();
        await (await open(far, store)).send();
        expect([...far.kept.keys()].toSorted()).toEqual(typed.toSorted());
        expect(far.order).toHaveLength(typed.length);
        expect(await idsIn(store)).toEqual([]);
        database.close();
      }),
      { numRuns: 200 },
    );
  }, 60_000);

  it('says that it is kept once it is on the disk, and takes the draft along in the same moment', async () => {
    const store = new DatabaseStore(await freshDatabase());
    await store.setDraft('a', { sheetId: bodice, row: 'waist:1', draft: { text: '612' } });
    const outbox = await open({ deliver: () => Promise.reject(new NoAnswer('no network')) }, store);
    const operation = keyed();
    const adding = outbox.add({ operation, clears: 'a' });
    expect(outbox.snapshot().operations).toEqual([operation]);
    expect([...outbox.snapshot().unkept]).toEqual([operation.id]);
    await adding;
    expect(outbox.snapshot().unkept.size).toBe(0);
    expect(await idsIn(store)).toEqual([operation.id]);
    expect(await store.drafts()).toEqual([]);
  });

  it('keeps what the disk refuses on the screen, says so, and asks the disk again', async () => {
    const store = new MemoryStore();
    let full = true;
    const keep = store.append.bind(store);
    store.append = (commit) =>
      full ? Promise.reject(new DOMException('full', 'QuotaExceededError')) : keep(commit);
    const later: (() => void)[] = [];
    const outbox = new DeviceOutbox({
      store,
      deliver: () => Promise.reject(new NoAnswer('no network')),
      alone: (work) => work(),
      tell: () => undefined,
      later: (attempt) => later.push(attempt),
    });
    const operation = keyed();
    await outbox.add({ operation });
    expect(outbox.snapshot().unkept.has(operation.id)).toBe(true);
    full = false;
    for (const attempt of later) attempt();
    await expect.poll(() => outbox.snapshot().unkept.size).toBe(0);
    expect(await idsIn(store)).toEqual([operation.id]);
  });

  it('keeps the order of a sheet, for a correction must come after what it corrects', async () => {
    const far = new FarSide();
    far.weather = ['lost-request', 'lost-request', 'lost-request'];
    const outbox = await open(far, new MemoryStore());
    const first = keyed(bodice, { typed: '162' });
    const second = keyed(bodice, { replaces: first.id });
    await outbox.add({ operation: first });
    await outbox.send();
    await outbox.add({ operation: second });
    far.weather = [];
    await outbox.send();
    expect(far.order).toEqual([first.id, second.id]);
  });

  it('sends nothing in another person’s name', async () => {
    const far = new FarSide();
    const store = new MemoryStore();
    const wenna = newId();
    const outbox = await open(far, store, wenna);
    const [hers, his] = [keyed(bodice, {}, wenna), keyed()];
    await outbox.add({ operation: his });
    await outbox.add({ operation: hers });
    await outbox.send();
    expect(far.order).toEqual([hers.id]);
    expect(await idsIn(store)).toEqual([his.id]);
    outbox.signedIn(odile);
    await outbox.send();
    expect(far.order).toEqual([hers.id, his.id]);
  });

  it('does not let one that cannot be taken hold up the others, nor drops it', async () => {
    const far = new FarSide();
    far.weather = ['lost-request', 'lost-request', 'lost-request', 'lost-request'];
    const store = new MemoryStore();
    const outbox = await open(far, store);
    const [good, bad, alsoGood] = [keyed(), keyed(), keyed(skirt)];
    far.refusing.add(bad.id);
    for (const operation of [good, bad, alsoGood]) await outbox.add({ operation });
    far.weather = [];
    await outbox.send();
    await outbox.send();
    expect(far.order).toEqual([good.id, alsoGood.id]);
    expect(outbox.snapshot().operations).toEqual([{ ...bad, state: 'decision', why: 'body.invalid' }]);
  });

  it('shows a conflict with what stands instead, and sends what the person decides', async () => {
    const far = new FarSide();
    const standing = storedReading(9, 'waist', '615');
    const mine = keyed();
    let conflict = true;
    const deliver: Deliver = (batch) => {
      if (!conflict) return far.deliver(batch);
      conflict = false;
      return Promise.resolve([{ id: mine.id, kept: false, why: 'Another reading stands.', standing }]);
    };
    const outbox = await open({ deliver }, new MemoryStore());
    await outbox.add({ operation: mine });
    await outbox.send();
    expect(outbox.snapshot().operations).toEqual([
      { ...mine, state: 'decision', why: 'Another reading stands.', standing },
    ]);
    const again = keyed(bodice, { replaces: standing.id });
    await outbox.decide(mine.id, again);
    await outbox.send();
    expect(far.order).toEqual([again.id]);
    expect(outbox.snapshot().operations).toEqual([]);
  });

  it('tries again later when nobody answers, each time waiting longer', async () => {
    const waits: number[] = [];
    const outbox = new DeviceOutbox({
      store: new MemoryStore(),
      deliver: () => Promise.reject(new NoAnswer('no network')),
      alone: (work) => work(),
      tell: () => undefined,
      later: (_attempt, ms) => waits.push(ms),
    });
    outbox.signedIn(odile);
    await outbox.add({ operation: keyed() });
    for (let attempt = 0; attempt < 10; attempt++) await outbox.send();
    expect(Math.min(...waits)).toBeGreaterThanOrEqual(500);
    expect(waits.at(-1)).toBeGreaterThanOrEqual(30_000);
    expect(Math.max(...waits)).toBeLessThanOrEqual(60_000);
  });
});
