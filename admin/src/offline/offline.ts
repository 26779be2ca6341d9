import { openDatabase } from './database.js';
import { type DeliveryWays, deliveryTo } from './deliver.js';
import { DeviceDrafts } from './drafts.js';
import { MemoryStore } from './memory-store.js';
import type { Operation, TablePicture } from './operation.js';
import { DeviceOutbox } from './outbox.js';
import { reach } from './reach.js';
import { Reference } from './reference.js';
import { DatabaseStore, type OfflineStore, type PictureBytes } from './store.js';
import { takeOver } from './take-over.js';

const CHANNEL = 'ellwand-offline';
const EVERY_MS = 30_000;

/** What this device keeps and sends: opened once, before the first screen. */
export interface Offline {
  readonly store: OfflineStore;
  readonly outbox: DeviceOutbox;
  readonly drafts: DeviceDrafts;
  readonly reference: Reference;
  /** Told what the API has kept, sheet by sheet. */
  readonly onArrived: (listener: DeliveryWays['arrived']) => () => void;
  readonly onPicture: (listener: (garmentId: string) => void) => () => void;
  /** When what an earlier visit left is there again. */
  readonly ready: Promise<void>;
  readonly close: () => void;
}

/** Opens the device's store, or memory where the browser keeps nothing. Never rejects. */
async function openStore(): Promise<OfflineStore> {
  try {
    if (!('indexedDB' in globalThis)) return new MemoryStore();
    return new DatabaseStore(await openDatabase());
  } catch {
    return new MemoryStore();
  }
}

class Listeners<Args extends readonly unknown[]> {
  private readonly all = new Set<(...args: Args) => void>();

  readonly add = (listener: (...args: Args) => void): (() => void) => {
    this.all.add(listener);
    return () => this.all.delete(listener);
  };

  readonly tell = (...args: Args): void => {
    for (const listener of this.all) listener(...args);
  };
}

/** One tab sends for the device; where the browser has no locks, each tab sends and the ids keep it harmless. */
async function alone(work: () => Promise<void>): Promise<void> {
  if ('locks' in navigator) await navigator.locks.request('ellwand-outbox', work);
  else await work();
}

/** Opens the device's store with all that an earlier visit left in it. Never rejects. */
export async function openOffline(): Promise<Offline> {
  const offline = startOffline(await openStore());
  await offline.ready;
  return offline;
}

export function startOffline(store: OfflineStore): Offline {
  const channel = 'BroadcastChannel' in globalThis ? new BroadcastChannel(CHANNEL) : null;
  const tell = () => channel?.postMessage('changed');
  const arrived = new Listeners<Parameters<DeliveryWays['arrived']>>();
  const pictures = new Listeners<[string]>();
  const deliver = deliveryTo({
    arrived: arrived.tell,
    pictureArrived: pictures.tell,
    pictureBytes: (id) => store.picture(id),
  });
  const outbox = new DeviceOutbox({
    store,
    deliver,
    alone,
    tell,
    later: (attempt, ms) => setTimeout(attempt, ms),
  });
  const drafts = new DeviceDrafts(store, tell);
  const ready = takeOver(store)
    .then(() => Promise.all([outbox.reread(), drafts.reread()]))
    .then(() => undefined);
  const stop = attend(outbox, drafts);
  if (channel)
    channel.onmessage = () => {
      void outbox.reread();
      void drafts.reread();
    };
  const close = () => {
    stop();
    channel?.close();
  };
  const listen = { onArrived: arrived.add, onPicture: pictures.add };
  return { store, outbox, drafts, reference: new Reference(store), ...listen, ready, close };
}

/** Sends when the network or the page comes back and every half minute; writes what was typed when the page goes. */
function attend(outbox: DeviceOutbox, drafts: DeviceDrafts): () => void {
  const send = () => void outbox.send();
  const turn = () => {
    if (document.visibilityState === 'hidden') void drafts.flush();
    else send();
  };
  const leave = () => void drafts.flush();
  const timer = setInterval(() => {
    send();
    void beat();
  }, EVERY_MS);
  window.addEventListener('online', send);
  window.addEventListener('pagehide', leave);
  document.addEventListener('visibilitychange', turn);
  const unsubscribe = reach.subscribe(() => {
    if (!reach.isSilent()) send();
  });
  return () => {
    clearInterval(timer);
    window.removeEventListener('online', send);
    window.removeEventListener('pagehide', leave);
    document.removeEventListener('visibilitychange', turn);
    unsubscribe();
  };
}

/** Asks whether our own server is there, so that "online" is known even while nothing else is asked. */
export async function beat(): Promise<void> {
  try {
    const answer = await fetch('/health/live', { cache: 'no-store' });
    if (answer.ok) reach.answered();
    else reach.unanswered();
  } catch {
    reach.unanswered();
  }
}

/** A camera picture, as the outbox takes it. */
export async function pictureOperation(
  picture: TablePicture,
  file: File,
  carried: Pick<Operation, 'sheetId' | 'by' | 'byName'>,
): Promise<{ readonly operation: Operation; readonly picture: PictureBytes }> {
  const bytes = await file.arrayBuffer();
  return {
    operation: { ...carried, id: picture.id, state: 'waiting', kind: 'picture', picture },
    picture: { bytes, type: file.type || 'image/jpeg' },
  };
}
