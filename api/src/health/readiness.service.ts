import { setTimeout as wait } from 'node:timers/promises';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { CATALOGUE } from '../common/catalogue-connection';
import { Disk, type DiskState } from '../common/disk';
import { Lifecycle } from '../common/lifecycle';
import { migrations } from '../database/connections';

/** A database that answers later than this is no help to whoever asks. */
const answersWithinMs = 500;

export interface Readiness {
  readonly ready: boolean;
  readonly database: 'answers' | 'silent';
  readonly migrations: 'current' | 'behind' | 'unknown';
  readonly disk: DiskState;
  readonly ending: boolean;
}

/** Whether requests should be sent here. */
@Injectable()
export class ReadinessService {
  private readonly wanted = migrations.map((migration) => new migration().name);

  constructor(
    @InjectDataSource() private readonly workroom: DataSource,
    @InjectDataSource(CATALOGUE) private readonly catalogue: DataSource,
    private readonly disk: Disk,
    private readonly lifecycle: Lifecycle,
  ) {}

  async look(): Promise<Readiness> {
    const [done, disk] = await Promise.all([this.migrationsDone(), this.disk.state()]);
    const database = done ? 'answers' : 'silent';
    const state = !done ? 'unknown' : this.wanted.every((name) => done.has(name)) ? 'current' : 'behind';
    const ending = this.lifecycle.isEnding;
    // A disk that is low still serves readers, and here only the writes are refused.
    const ready = !ending && state === 'current' && disk !== 'unreachable';
    return { ready, database, migrations: state, disk, ending };
  }

  /** @returns undefined where one of the two connections does not answer in time */
  private async migrationsDone(): Promise<ReadonlySet<string> | undefined> {
    const late = new AbortController();
    try {
      return await Promise.race([
        this.ask(),
        wait(answersWithinMs, undefined, { signal: late.signal, ref: false }),
      ]);
    } catch {
      return undefined;
    } finally {
      late.abort();
    }
  }

  private async ask(): Promise<ReadonlySet<string>> {
    const [rows] = await Promise.all([
      this.workroom.query<{ name: string }[]>('SELECT name FROM ellwand.migration'),
      this.catalogue.query('SELECT 1'),
    ]);
    return new Set(rows.map((row) => row.name));
  }
}
