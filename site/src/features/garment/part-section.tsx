import type { PublishedImage, PublishedPart } from '@ellwand/shared/records/published-garment';
import { extraLinesOf } from '@ellwand/shared/protocols/extra-lines';
import { lettersInOrder, protocolPointIds } from '@ellwand/shared/protocols/protocol';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { type ReactNode, useMemo } from 'react';
import { useLitPoints } from '../../components/diagram/lit-points';
import { MeasuringDiagram } from '../../components/diagram/measuring-diagram';
import { Picture } from '../../components/ui/picture';
import { CutSheet } from './cut-sheet';
import { DerivedValues } from './derived-values';
import { MeasurementTable } from './measurement-table';
import { NotTaken } from './not-taken';
import { OwnPoints } from './own-points';
import { PartFacts } from './part-facts';

interface PartSectionProps {
  readonly part: PublishedPart;
  readonly index: number;
  /** The garment's only part needs no heading of its own. */
  readonly alone: boolean;
  /** Stands in the drawing's place while nothing of the part is measured. */
  readonly picture: PublishedImage | null;
  /** The garment's own heading, beside its first part. */
  readonly heading: ReactNode;
}

/** One part: its diagram in seven columns, its measurements in five; pointing at either lights both. */
export function PartSection({ part, index, alone, picture, heading }: PartSectionProps) {
  const rowId = (pointId: string) => `part-${index + 1}-${pointId}`;
  const lit = useLitPoints(rowId);
  const letters = useMemo(() => lettersOf(part), [part]);
  const ownLines = useMemo(() => extraLinesOf(part.ownPoints), [part]);
  const points = useMemo(() => [...new Set(part.measurements.map(({ pointId }) => pointId))], [part]);
  const title = alone ? 'Measurements' : `${part.name}: measurements`;
  return (
    <section className="part" aria-label={alone ? 'Measurements' : part.name}>
      {heading}
      <div className="part-drawing">
        {points.length > 0 ? (
          <MeasuringDiagram
            kind={part.kind}
            points={points}
            letters={letters}
            ownLines={ownLines}
            lit={lit}
            prefix={`part-${index + 1}`}
          />
        ) : (
          picture && <Picture image={picture} sizes="(width >= 64rem) 56vw, 92vw" first={index === 0} />
        )}
      </div>
      <div className="part-measures">
        <h2>{title}</h2>
        <p className="inside-note">
          Inside of the garment as fastened; not the wearer’s body, nor a modern size.
        </p>
        <MeasurementTable part={part} letters={letters} lit={lit} rowId={rowId} />
        <OwnPoints part={part} />
        <NotTaken part={part} />
        <DerivedValues part={part} />
        <PartFacts part={part} />
      </div>
      <CutSheet part={part} id={`part-${index + 1}-cut`} />
    </section>
  );
}

/** The letters of the protocol that it was measured by; documents from before it was kept, of the house's first. */
function lettersOf({ kind, protocol }: PublishedPart): ReadonlyMap<string, string> {
  return lettersInOrder(protocol?.pointIds ?? protocolPointIds(protocolFor(kind)));
}
