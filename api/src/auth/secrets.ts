import { createHash, createHmac } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { ENVIRONMENT } from '../common/environment.token';

export type KeyPurpose = 'access-token' | 'refresh-successor' | 'slow-down';

/** Keys for one purpose each, derived from the installation's secret: what one signs, another does not accept. */
@Injectable()
export class Secrets {
  constructor(@Inject(ENVIRONMENT) private readonly environment: { readonly secret: string }) {}

  /** 32 bytes, always the same for this installation and purpose. */
  key(purpose: KeyPurpose): Buffer {
    return createHmac('sha256', this.environment.secret).update(`ellwand ${purpose}`).digest();
  }

  /** @returns base64url, 43 letters */
  mac(purpose: KeyPurpose, text: string): string {
    return createHmac('sha256', this.key(purpose)).update(text).digest('base64url');
  }
}

/** What is kept of a secret that somebody else holds: its SHA-256, hex. The secret is random, so no salt is needed. */
export function hashOf(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}
