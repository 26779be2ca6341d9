import type { formFormats } from '@ellwand/shared/records/image';
import type { PictureType } from '../intake/sniff-picture';

/** What the API asks its decoding process, one thing at a time. Paths are on this machine. */
export type EngineRequest =
  | {
      readonly kind: 'inspect';
      readonly source: string;
      readonly type: PictureType;
      /** Where to put the picture turned upright, in sRGB, at most as wide as the widest form. */
      readonly master: string;
      /** A file name that may be used and is removed afterwards. */
      readonly scratch: string;
    }
  | {
      readonly kind: 'make';
      readonly master: string;
      readonly format: (typeof formFormats)[number];
      readonly widthPx: number;
      readonly target: string;
      /** XMP to write into the form. */
      readonly xmp: string;
    };

/** The upright original's size, or why the picture is refused, as a sentence for whoever sent it. */
export type EngineAnswer =
  | { readonly ok: true; readonly widthPx: number; readonly heightPx: number }
  | { readonly ok: false; readonly sentence: string };

export interface EngineReady {
  readonly ready: true;
}

/** Said where the process ran out of time or memory. */
export const tooMuch = 'This picture takes more time or memory to open than is allowed. Send a smaller copy.';
