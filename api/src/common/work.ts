import { setTimeout as wait } from 'node:timers/promises';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';

/** A transaction's own manager. Everything a verb reads or writes goes through it: see `Work`. */
export type Tx = EntityManager;

/** Deadlock, lock wait time-out, record changed since it was read: the whole transaction may be tried again. */
const retriable = new Set([1213, 1205, 1020]);
const attempts = 5;

/**
 * Runs a verb's work in one transaction, whole again (up to five times, with jitter) where the database chose it
 * as a deadlock's victim. Use the manager that is handed in for every statement: a repository outside of the
 * transaction takes a second connection, and enough of those hang the pool.
 */
@Injectable()
export class Work {
  constructor(@InjectDataSource() private readonly source: DataSource) {}

  async run<T>(verb: (tx: Tx) => Promise<T>): Promise<T> {
    for (let attempt = 1; ; attempt++) {
      try {
        return await this.source.transaction('READ COMMITTED', verb);
      } catch (fault) {
        if (attempt >= attempts || !isRetriable(fault)) throw fault;
        await wait(attempt * 10 + Math.random() * 30);
      }
    }
  }

  /** For reading alone, outside of any transaction. */
  get reader(): EntityManager {
    return this.source.manager;
  }
}

function isRetriable(fault: unknown): boolean {
  return (
    fault instanceof Error &&
    'errno' in fault &&
    typeof fault.errno === 'number' &&
    retriable.has(fault.errno)
  );
}

/** Whether a row of that key is there already: two requests for the same thing came at once. */
export function isDuplicate(fault: unknown): boolean {
  return fault instanceof Error && 'errno' in fault && fault.errno === 1062;
}
