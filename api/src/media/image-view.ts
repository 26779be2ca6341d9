import type { Image } from '@ellwand/shared/records/image';
import { ImageView } from '@ellwand/shared/records/image';
import type { ImageRow } from './image.entity';

/** A picture as the Workroom sees it; where its files lie is nobody's business outside of this room. */
export function toImage(row: ImageRow): Image {
  return {
    id: row.id,
    garmentId: row.garmentId,
    version: row.version,
    position: row.position,
    view: ImageView.parse(row.view),
    alt: row.alt,
    caption: row.caption,
    credit: row.credit,
    hidden: row.hidden,
    fileName: row.fileName,
    state: row.state,
    formsMade: row.formsMade,
    formsWanted: row.formsWanted,
    refusal: row.refusal,
    widthPx: row.widthPx,
    heightPx: row.heightPx,
    widths: row.widths,
    pointId: row.pointId,
    takenOn: row.takenOn,
    createdAt: row.createdAt.toISOString(),
  };
}
