import { createHmac, randomBytes } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { compare, hash } from 'bcrypt';

/** Injects bcrypt's cost. */
export const PASSWORD_COST = Symbol('password cost');

/** 2¹² rounds: about half a second of one core for each guess. */
export const passwordCost = 12;

/**
 * bcrypt reads no further than 72 bytes and stops at a zero byte. A keyed digest in base64 (44 letters) stands for
 * the whole password; its fixed key keeps plain SHA-256 lists stolen elsewhere from being tried here as they are.
 */
const digestOf = (password: string) =>
  createHmac('sha256', 'ellwand password').update(password.normalize('NFC'), 'utf8').digest('base64');

/** Keeps passwords as bcrypt of their digest, and takes the same time for people that do not exist. */
@Injectable()
export class Passwords {
  /** What the password of an unknown person is compared with; of the same cost as a real one. */
  private readonly nobodys: Promise<string>;

  constructor(@Inject(PASSWORD_COST) private readonly cost: number) {
    this.nobodys = hash(randomBytes(32).toString('base64'), cost);
  }

  keep(password: string): Promise<string> {
    return hash(digestOf(password), this.cost);
  }

  /** @param kept null for a person who does not exist, or has no password yet: never true, and no sooner known */
  async fits(password: string, kept: string | null): Promise<boolean> {
    const fits = await compare(digestOf(password), kept ?? (await this.nobodys));
    return fits && kept !== null;
  }
}
