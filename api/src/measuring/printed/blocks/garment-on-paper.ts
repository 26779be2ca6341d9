import type { Sheet } from '@ellwand/shared/records/sheet';

/** What a printed sheet says of the garment that it belongs to. */
export interface GarmentOnPaper {
  /** With its part's suffix. */
  readonly number: string;
  readonly title: string;
  readonly date: string;
  readonly maker: string | null;
  readonly part: string;
  readonly handling: string;
  readonly hazards: Sheet['garment']['hazards'];
  /** The garment in the Workroom, for the square to lead to: nothing opens there without signing in. */
  readonly link: string;
}
