import type { NewReading, StoredReading } from '@ellwand/shared/records/sheet';
import type { NewTableNote } from '@ellwand/shared/records/table-note';
import { newId } from '../../../lib/ids.js';
import { deviceName } from '../../../offline/device.js';
import type { DeviceDrafts } from '../../../offline/drafts.js';
import { pictureOperation } from '../../../offline/offline.js';
import type { Operation, OperationOf, TablePicture } from '../../../offline/operation.js';
import type { DeviceOutbox, OutboxState } from '../../../offline/outbox.js';

/** A committed reading that the API has not kept yet. It leaves only when it is kept or when a person decides. */
export interface OutboxEntry {
  readonly reading: NewReading;
  readonly state: 'waiting' | 'decision';
  /** Why a person must decide, in a sentence. */
  readonly why?: string;
  /** The reading that stands at this point and round instead. */
  readonly standing?: StoredReading;
}

/** What of one sheet is still on this device alone. */
export interface OutboxView {
  readonly entries: readonly OutboxEntry[];
  readonly notes: readonly OperationOf<'note'>[];
  readonly pictures: readonly OperationOf<'picture'>[];
  /** How many are under way just now. */
  readonly sending: number;
  /** When the last one was kept by the API; null before any. */
  readonly sentAt: number | null;
  /** How many are on no disk yet. */
  readonly unkept: number;
}

/** Everything that can be said in a note, without what carries it. */
type Said<Note = NewTableNote> = Note extends NewTableNote ? Omit<Note, 'id' | 'device' | 'saidAt'> : never;

export interface Keeper {
  readonly id: string;
  readonly name: string;
}

/** One sheet's own way into the device's outbox, in the name of whoever is signed in. */
export class SheetOutbox {
  private seen: OutboxState | null = null;
  private view: OutboxView = viewOf([], { operations: [], sending: 0, sentAt: null, unkept: new Set() });

  constructor(
    private readonly device: DeviceOutbox,
    private readonly drafts: DeviceDrafts,
    private readonly sheetId: string,
    private readonly keeper: Keeper,
  ) {}

  readonly subscribe = (listener: () => void): (() => void) => this.device.subscribe(listener);

  readonly snapshot = (): OutboxView => {
    const state = this.device.snapshot();
    if (state !== this.seen) {
      this.seen = state;
      this.view = viewOf(
        state.operations.filter(({ sheetId }) => sheetId === this.sheetId),
        state,
      );
    }
    return this.view;
  };

  /** Appends a reading; the row's draft leaves the disk in the same moment. Resolves once it is kept. */
  add(reading: NewReading, row?: string): Promise<void> {
    const operation: Operation = { ...this.carried(reading.id), kind: 'reading', reading };
    const clears = row === undefined ? {} : { clears: this.drafts.handOver(this.sheetId, row) };
    return this.device.add({ operation, ...clears });
  }

  /** Says something that is no reading. */
  say(said: Said): Promise<void> {
    const id = newId();
    const note = { ...said, id, device: deviceName(), saidAt: new Date().toISOString() } as NewTableNote;
    return this.device.add({ operation: { ...this.carried(id), kind: 'note', note } });
  }

  /** Keeps a picture from the camera until it can be sent. */
  async photograph(picture: Omit<TablePicture, 'id' | 'fileName'>, file: File): Promise<void> {
    const { sheetId, keeper } = this;
    const taken = { ...picture, id: newId(), fileName: file.name || 'table.jpg' };
    await this.device.add(
      await pictureOperation(taken, file, { sheetId, by: keeper.id, byName: keeper.name }),
    );
  }

  /** A person decided about a reading: it is dropped, or another takes its place. */
  decide(id: string, instead?: NewReading): Promise<void> {
    const operation: Operation | undefined = instead && {
      ...this.carried(instead.id),
      kind: 'reading',
      reading: instead,
    };
    return this.device.decide(id, operation);
  }

  send(): Promise<void> {
    return this.device.send();
  }

  private carried(id: string) {
    const { sheetId, keeper } = this;
    return { id, sheetId, by: keeper.id, byName: keeper.name, state: 'waiting' as const };
  }
}

function viewOf(own: readonly Operation[], { sending, sentAt, unkept }: OutboxState): OutboxView {
  const readings = own.filter((one): one is OperationOf<'reading'> => one.kind === 'reading');
  return {
    entries: readings.map(({ reading, state, why, standing }) => ({
      reading,
      state,
      ...(why === undefined ? {} : { why }),
      ...(standing === undefined ? {} : { standing }),
    })),
    notes: own.filter((one): one is OperationOf<'note'> => one.kind === 'note'),
    pictures: own.filter((one): one is OperationOf<'picture'> => one.kind === 'picture'),
    sending,
    sentAt,
    unkept: own.filter(({ id }) => unkept.has(id)).length,
  };
}
