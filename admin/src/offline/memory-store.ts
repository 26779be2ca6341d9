import type { KeptDraft, KeptReference } from './database.js';
import type { Operation, Placed } from './operation.js';
import type { Commit, OfflineStore, PictureBytes } from './store.js';

/** Stands in where the browser keeps nothing: at least this page forgets nothing while it is open. */
export class MemoryStore implements OfflineStore {
  readonly lasting = false;
  private readonly outbox = new Map<number, Operation>();
  private readonly kept = new Map<string, KeptDraft>();
  private readonly references = new Map<string, KeptReference>();
  private readonly pictures = new Map<string, PictureBytes>();
  private next = 1;

  operations(): Promise<readonly Placed[]> {
    const placed = [...this.outbox].map(([place, operation]) => ({ place, operation }));
    return Promise.resolve(placed.toSorted((one, other) => one.place - other.place));
  }

  append({ operation, clears, picture }: Commit): Promise<void> {
    this.outbox.set(this.next++, operation);
    if (clears !== undefined) this.kept.delete(clears);
    if (picture) this.pictures.set(operation.id, picture);
    return Promise.resolve();
  }

  replace(place: number, operation: Operation): Promise<void> {
    this.outbox.set(place, operation);
    return Promise.resolve();
  }

  remove(places: readonly number[], ids: readonly string[]): Promise<void> {
    for (const place of places) this.outbox.delete(place);
    for (const id of ids) this.pictures.delete(id);
    return Promise.resolve();
  }

  drafts(): Promise<readonly KeptDraft[]> {
    return Promise.resolve([...this.kept.values()]);
  }

  setDraft(key: string, draft: KeptDraft | null): Promise<void> {
    if (draft) this.kept.set(key, draft);
    else this.kept.delete(key);
    return Promise.resolve();
  }

  reference(key: string): Promise<KeptReference | undefined> {
    return Promise.resolve(this.references.get(key));
  }

  referenceKeys(): Promise<readonly string[]> {
    return Promise.resolve([...this.references.keys()]);
  }

  keep(key: string, reference: KeptReference): Promise<void> {
    this.references.set(key, reference);
    return Promise.resolve();
  }

  forget(key: string): Promise<void> {
    this.references.delete(key);
    return Promise.resolve();
  }

  picture(id: string): Promise<PictureBytes | undefined> {
    return Promise.resolve(this.pictures.get(id));
  }
}
