import type { Tx } from '../common/work';

/** A museum's own number as a public one: lower case, runs of anything else become one hyphen. */
export function slugOf(ownNumber: string): string {
  const slug = ownNumber
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '')
    .slice(0, 70)
    .replace(/-$/, '');
  return slug || 'garment';
}

/** A public number that was never given before, withdrawn garments' included. */
export async function freePublicNumber(tx: Tx, ownNumber: string): Promise<string> {
  const slug = slugOf(ownNumber);
  const rows: { number: string }[] = await tx.query(
    'SELECT number FROM ellwand_catalogue.published_garment WHERE number = ? OR number LIKE ?',
    [slug, `${slug}-%`],
  );
  const used = new Set(rows.map((row) => row.number));
  for (let count = 1; ; count++) {
    const candidate = count === 1 ? slug : `${slug}-${count}`;
    if (!used.has(candidate)) return candidate;
  }
}
