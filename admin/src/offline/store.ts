import { type Database, type KeptDraft, type KeptReference, strict } from './database.js';
import type { Operation, Placed } from './operation.js';

export interface PictureBytes {
  readonly bytes: ArrayBuffer;
  readonly type: string;
}

/** What goes in together, or not at all. */
export interface Commit {
  readonly operation: Operation;
  /** The draft that this operation came from. */
  readonly clears?: string;
  readonly picture?: PictureBytes;
}

/** Where the device keeps things. Every promise resolves when it is kept, and not before. */
export interface OfflineStore {
  /** False where this browser keeps nothing, and memory stands in until the page is closed. */
  readonly lasting: boolean;
  operations(): Promise<readonly Placed[]>;
  append(commit: Commit): Promise<void>;
  /** Another operation takes the place of this one. */
  replace(place: number, operation: Operation): Promise<void>;
  remove(places: readonly number[], ids: readonly string[]): Promise<void>;
  drafts(): Promise<readonly KeptDraft[]>;
  setDraft(key: string, draft: KeptDraft | null): Promise<void>;
  reference(key: string): Promise<KeptReference | undefined>;
  referenceKeys(): Promise<readonly string[]>;
  keep(key: string, reference: KeptReference): Promise<void>;
  forget(key: string): Promise<void>;
  picture(id: string): Promise<PictureBytes | undefined>;
}

/** The device's own database. */
export class DatabaseStore implements OfflineStore {
  readonly lasting = true;

  constructor(private readonly database: Database) {}

  async operations(): Promise<readonly Placed[]> {
    // Both of one transaction, and each in one step: a cursor would take a turn of the page for every operation.
    const { store } = this.database.transaction('outbox');
    const [places, operations] = await Promise.all([store.getAllKeys(), store.getAll()]);
    return operations.map((operation, index) => ({ place: places[index]!, operation }));
  }

  async append({ operation, clears, picture }: Commit): Promise<void> {
    const transaction = this.database.transaction(['outbox', 'drafts', 'pictures'], 'readwrite', strict);
    const steps: Promise<unknown>[] = [transaction.objectStore('outbox').add(operation)];
    if (clears !== undefined) steps.push(transaction.objectStore('drafts').delete(clears));
    if (picture) steps.push(transaction.objectStore('pictures').put(picture, operation.id));
    await Promise.all([...steps, transaction.done]);
  }

  async replace(place: number, operation: Operation): Promise<void> {
    const transaction = this.database.transaction('outbox', 'readwrite', strict);
    await Promise.all([transaction.store.put(operation, place), transaction.done]);
  }

  async remove(places: readonly number[], ids: readonly string[]): Promise<void> {
    const transaction = this.database.transaction(['outbox', 'pictures'], 'readwrite', strict);
    await Promise.all([
      ...places.map((place) => transaction.objectStore('outbox').delete(place)),
      ...ids.map((id) => transaction.objectStore('pictures').delete(id)),
      transaction.done,
    ]);
  }

  drafts(): Promise<readonly KeptDraft[]> {
    return this.database.getAll('drafts');
  }

  async setDraft(key: string, draft: KeptDraft | null): Promise<void> {
    if (draft) await this.database.put('drafts', draft, key);
    else await this.database.delete('drafts', key);
  }

  reference(key: string): Promise<KeptReference | undefined> {
    return this.database.get('reference', key);
  }

  referenceKeys(): Promise<readonly string[]> {
    return this.database.getAllKeys('reference');
  }

  async keep(key: string, reference: KeptReference): Promise<void> {
    await this.database.put('reference', reference, key);
  }

  async forget(key: string): Promise<void> {
    await this.database.delete('reference', key);
  }

  picture(id: string): Promise<PictureBytes | undefined> {
    return this.database.get('pictures', id);
  }
}
