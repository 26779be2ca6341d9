import { randomUUID } from 'node:crypto';

/** A letter as it was taken in. */
export interface DroppedLetter {
  readonly id: string;
  readonly receivedAt: Date;
  readonly from: string;
  readonly to: readonly string[];
  readonly subject: string;
  readonly text: string;
}

/** Older letters make room. */
const kept = 200;

/** What has come in, latest first, in memory alone: links in letters are secrets. */
export class Inbox {
  private letters: readonly DroppedLetter[] = [];

  take(letter: Omit<DroppedLetter, 'id'>): void {
    this.letters = [{ id: randomUUID(), ...letter }, ...this.letters].slice(0, kept);
  }

  get all(): readonly DroppedLetter[] {
    return this.letters;
  }

  find(id: string): DroppedLetter | undefined {
    return this.letters.find((letter) => letter.id === id);
  }
}
