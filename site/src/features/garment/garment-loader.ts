import { type GarmentFound, type SiteCatalogue } from '@ellwand/shared/records/site-catalogue';

/** `:version` is a whole number from 1; anything else names nothing. */
export async function garmentLoader(
  catalogue: SiteCatalogue,
  params: { readonly number?: string | undefined; readonly version?: string | undefined },
): Promise<GarmentFound> {
  const { number = '', version } = params;
  if (!/^[a-z0-9-]{1,80}$/.test(number)) return { found: 'nothing' };
  if (version === undefined) return catalogue.garment(number);
  if (!/^[1-9]\d{0,5}$/.test(version)) return { found: 'nothing' };
  return catalogue.garment(number, Number(version));
}
