import { Clock } from '../../src/common/clock';

/** Goes with the real clock, shifted by what a test has advanced it. */
export class SettableClock extends Clock {
  private shiftMs = 0;

  override now(): Date {
    return new Date(Date.now() + this.shiftMs);
  }

  advance(by: { days?: number; hours?: number; minutes?: number; seconds?: number }): void {
    const minutes = ((by.days ?? 0) * 24 + (by.hours ?? 0)) * 60 + (by.minutes ?? 0);
    this.shiftMs += minutes * 60_000 + (by.seconds ?? 0) * 1_000;
  }

  reset(): void {
    this.shiftMs = 0;
  }
}
