import type { Garment } from '@ellwand/shared/records/garment';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { AddPart } from './add-part.js';
import { LayTogether } from './lay-together.js';
import { PartCard } from './part-card.js';

/** The garment's parts and their measuring sheets. */
export function PartsPanel({ garment, locked }: { readonly garment: Garment; readonly locked: boolean }) {
  const [adding, setAdding] = useState(false);
  return (
    <section id="parts" aria-labelledby="parts-title">
      <h2 id="parts-title" className="title text-title-28">
        Parts and sheets
      </h2>
      <ul className="mt-2 space-y-3">
        {garment.parts.map((part) => (
          <PartCard key={part.id} garment={garment} part={part} locked={locked} />
        ))}
      </ul>
      {!locked && !adding && (
        <div className="mt-3 flex flex-wrap gap-2">
          <Button onClick={() => setAdding(true)}>Add a part</Button>
          <LayTogether garment={garment} />
        </div>
      )}
      {adding && <AddPart garment={garment} onDone={() => setAdding(false)} />}
    </section>
  );
}
