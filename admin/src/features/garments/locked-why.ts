import type { Garment } from '@ellwand/shared/records/garment';

/** Why the record cannot be written now, in words; null while it can. */
export function lockedWhy(garment: Garment, mayWrite: boolean): string | null {
  if (!mayWrite) return 'You can read this record. Writing it is for recorders and curators.';
  switch (garment.stage) {
    case 'in-review':
      return 'This record is in review, so that the curator reads what you sent. It can be changed again when it is returned or published.';
    case 'approved':
      return 'This record is approved and waits to be published. What was approved is what will be published, so nothing can be changed now.';
    case 'withdrawn':
      return 'This record is withdrawn from the public. Make a new draft to change it.';
    default:
      return null;
  }
}
