import { readDate } from '@ellwand/shared/records/edtf-date';
import { rightsStatements } from '@ellwand/shared/records/garment';
import type { Image } from '@ellwand/shared/records/image';
import type { PublishedDocument, PublishedImage } from '@ellwand/shared/records/published-garment';
import type { Snapshot } from '../snapshot';
import { projectPart } from './project-part';

/** What publishing adds to the frozen garment: its public number and version, when, and by which museum. */
export interface Imprint {
  readonly number: string;
  readonly version: number;
  readonly publishedAt: string;
  readonly museum: string;
}

/**
 * The public copy: a pure function of what was frozen at review. Every field is named here one by one, so that
 * nothing private (store location, provenance, handling, hidden pictures, people's names unless shown) can slip in
 * with a spread; a test holds it.
 */
export function projectGarment(snapshot: Snapshot, imprint: Imprint): PublishedDocument {
  const { record } = snapshot;
  const date = readDate(record.date);
  if (!date) throw new Error(`The date ${record.date} of ${record.ownNumber} cannot be read`);
  const pictures = snapshot.images.filter((image) => !image.hidden && image.state === 'ready');
  const { ownNumber, showPeople } = record;
  const context = { ownNumber, showPeople, pictures, parts: snapshot.parts };
  return {
    number: imprint.number,
    version: imprint.version,
    ownNumber: record.ownNumber,
    title: record.title,
    kind: record.kind,
    wornBy: record.wornBy,
    description: record.description,
    date,
    maker: record.maker,
    label: record.label,
    place: record.place,
    materials: record.materials,
    techniques: record.techniques,
    colours: record.colours,
    fastenings: record.fastenings,
    lining: record.lining,
    alterations: record.alterations,
    condition: record.condition,
    hazards: record.showHazards ? record.hazards : [],
    wearer: record.wearer,
    references: record.references,
    otherNumbers: record.otherNumbers,
    creditLine: record.creditLine,
    rights: { uri: record.rights, label: rightsStatements[record.rights] },
    parts: snapshot.parts.map((part) => projectPart(part, context)),
    images: pictures.flatMap(projectImage),
    museum: imprint.museum,
    publishedAt: imprint.publishedAt,
  };
}

function projectImage(image: Image): PublishedImage[] {
  if (image.widthPx === null || image.heightPx === null) return [];
  const { id, view, alt, caption, credit, widthPx, heightPx, widths } = image;
  return [{ id, view, alt, caption, credit, widthPx, heightPx, widths }];
}
