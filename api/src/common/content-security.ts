import { Injectable } from '@nestjs/common';

/**
 * Which inline scripts the pages may run. Whoever renders a page names the hashes of its constant scripts here;
 * everything else inline is refused by the browser.
 */
@Injectable()
export class ContentSecurity {
  private readonly sources = new Set(["'self'"]);

  /** @param hashes as they stand in a policy, `sha256-…` in base64, without quotes */
  allowScripts(hashes: readonly string[]): void {
    for (const hash of hashes) {
      if (!/^sha(256|384|512)-[A-Za-z0-9+/]+={0,2}$/.test(hash)) {
        throw new Error(`Expected the hash of a script, sha256-…, got ${hash}`);
      }
      this.sources.add(`'${hash}'`);
    }
  }

  /** What stands behind `script-src`. */
  get scriptSources(): string {
    return [...this.sources].join(' ');
  }
}
