import { type DBSchema, type IDBPDatabase, openDB } from 'idb';
import type { Operation } from './operation.js';

/** Typed and not yet committed, with its unit: never converted. The key is `sheet row`. */
export interface KeptDraft {
  readonly sheetId: string;
  readonly row: string;
  readonly draft: unknown;
}

/** Something fetched before, for when there is no network; read with a schema before it is used. */
export interface KeptReference {
  readonly value: unknown;
  readonly keptAt: string;
}

export interface WorkroomDatabase extends DBSchema {
  outbox: { key: number; value: Operation };
  drafts: { key: string; value: KeptDraft };
  reference: { key: string; value: KeptReference };
  /** Bytes and their type: what a picture is survives every version of the structured clone. */
  pictures: { key: string; value: { readonly bytes: ArrayBuffer; readonly type: string } };
}

const NAME = 'ellwand-workroom';
const VERSION = 1;

export type Database = IDBPDatabase<WorkroomDatabase>;

/** Opens the device's database. Rejects where the browser keeps nothing (a private window, no room). */
export function openDatabase(name = NAME): Promise<Database> {
  return openDB<WorkroomDatabase>(name, VERSION, {
    upgrade(database) {
      database.createObjectStore('outbox', { autoIncrement: true });
      database.createObjectStore('drafts');
      database.createObjectStore('reference');
      database.createObjectStore('pictures');
    },
    blocking(_current, _blocked, event) {
      // Another tab brings a newer database: stand aside rather than hold it up.
      (event.target as IDBDatabase).close();
    },
  });
}

/** On the disk when it says so: without this, a power cut loses what was acknowledged. */
export const strict = { durability: 'strict' } as const;
