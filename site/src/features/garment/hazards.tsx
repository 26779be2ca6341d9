import type { PublishedGarment } from '@ellwand/shared/records/published-garment';

const hazardWords: Readonly<Record<string, string>> = {
  arsenic: 'Arsenic',
  lead: 'Lead',
  mercury: 'Mercury',
  pesticide: 'Old pesticides',
  'cellulose-nitrate': 'Cellulose nitrate',
  'weighted-silk': 'Weighted silk',
  asbestos: 'Asbestos',
  mould: 'Mould',
  sharp: 'Pins, wires or steels',
};

const standingWords: Readonly<Record<string, string>> = {
  suspected: 'suspected; not tested',
  'tested-present': 'tested, and found',
  'tested-absent': 'tested, and not found',
};

/** What in the garment can hurt whoever handles it, with the cautions the house gives its own people. */
export function Hazards({ hazards }: { readonly hazards: PublishedGarment['hazards'] }) {
  if (hazards.length === 0) return null;
  const present = hazards.some(({ standing }) => standing !== 'tested-absent');
  return (
    <section>
      <h2>Hazards</h2>
      <ul className="hazards">
        {hazards.map(({ id, standing, note }) => (
          <li key={id}>
            <strong>{hazardWords[id] ?? id}</strong>: {standingWords[standing] ?? standing}.
            {note && ` ${note}`}
          </li>
        ))}
      </ul>
      {present && (
        <p className="text-ink-2">
          Whoever handles a garment like this wears disposable gloves and washes their hands; does not steam,
          iron or brush it; airs the room, since a dust mask does not stop vapour; and follows the rules of
          their own institution and country.
        </p>
      )}
    </section>
  );
}
