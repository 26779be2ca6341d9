/** The little of jsdom that the tests use; it ships no types of its own. */
declare module 'jsdom' {
  export interface DocumentOptions {
    readonly url?: string;
    readonly runScripts?: 'dangerously';
    readonly beforeParse?: (window: Window) => void;
  }

  export class JSDOM {
    constructor(html: string, options?: DocumentOptions);
    readonly window: Window & typeof globalThis;
  }
}
