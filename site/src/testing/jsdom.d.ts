/** The little of jsdom that the tests use; it ships no types of its own. */
declare module 'jsdom' {
  export class JSDOM {
    constructor(html: string);
    readonly window: Window & typeof globalThis;
  }
}
