import type { PublishedGarment } from '@ellwand/shared/records/published-garment';
import { Citation } from './citation';
import { GarmentHeading } from './garment-heading';
import { GarmentPictures } from './garment-pictures';
import { Hazards } from './hazards';
import { PartSection } from './part-section';
import { PrintCheck } from './print-check';
import { Prose } from './prose';
import { Versions } from './versions';

interface GarmentViewProps {
  readonly garment: PublishedGarment;
  readonly origin: string;
}

/** The garment's page: what it is, its parts with diagram and measurements, pictures, condition, how to cite. */
export function GarmentView({ garment, origin }: GarmentViewProps) {
  return (
    <article className="wide garment">
      {garment.state === 'current' ? null : <OldVersion garment={garment} />}
      {garment.parts.map((part, index) => (
        <PartSection
          key={part.number}
          part={part}
          index={index}
          alone={garment.parts.length === 1}
          picture={garment.images[index] ?? garment.images[0] ?? null}
          heading={index === 0 ? <GarmentHeading garment={garment} /> : null}
        />
      ))}
      {garment.parts.length === 0 && <GarmentHeading garment={garment} />}
      <GarmentPictures images={garment.images} />
      <div className="garment-notes">
        <Prose title="Description" text={garment.description} />
        <Prose title="Condition when measured" text={garment.condition} />
        <Prose title="Fastenings" text={garment.fastenings} />
        <Prose title="Lining" text={garment.lining} />
        <Prose title="Alterations" text={garment.alterations} />
        <Label label={garment.label} />
        <Prose title="Worn by" text={garment.wearer} />
        <Hazards hazards={garment.hazards} />
        <Prose title="References" text={garment.references} />
      </div>
      <div className="garment-end">
        <Citation garment={garment} origin={origin} />
        <Versions garment={garment} />
      </div>
      <PrintCheck />
    </article>
  );
}

function Label({ label }: { readonly label: PublishedGarment['label'] }) {
  if (!label) return null;
  return (
    <section>
      <h2>Maker’s label</h2>
      <blockquote className="label-words">{label.transcription}</blockquote>
      <p className="text-ink-2">{label.where}</p>
    </section>
  );
}

function OldVersion({ garment }: { readonly garment: PublishedGarment }) {
  return (
    <p className="old-version">
      <strong>Version {garment.version} is not the current one.</strong> It stays here unchanged so that
      citations of it hold.
    </p>
  );
}
