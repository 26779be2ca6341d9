import { statfs } from 'node:fs/promises';
import { Inject, Injectable } from '@nestjs/common';
import { ENVIRONMENT } from './environment.token';

interface DiskSettings {
  readonly dataFolder: string;
  readonly diskFloorBytes: number;
}

export type DiskState = 'enough' | 'low' | 'unreachable';

/** Asking the file system costs little, but not nothing, at each of a burst of writes. */
const freshMs = 1_000;

/** How much room is left where pictures and the database lie. */
@Injectable()
export class Disk {
  private last: { readonly at: number; readonly state: DiskState } | undefined;

  constructor(@Inject(ENVIRONMENT) private readonly settings: DiskSettings) {}

  /** `low`: below the floor, where reading goes on and writing is refused. At most a second old. */
  async state(): Promise<DiskState> {
    const at = performance.now();
    if (this.last && at - this.last.at < freshMs) return this.last.state;
    const state = await this.look();
    this.last = { at, state };
    return state;
  }

  private async look(): Promise<DiskState> {
    try {
      const { bavail, bsize } = await statfs(this.settings.dataFolder);
      return bavail * bsize < this.settings.diskFloorBytes ? 'low' : 'enough';
    } catch {
      return 'unreachable';
    }
  }
}
