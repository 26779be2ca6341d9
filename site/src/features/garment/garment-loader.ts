import type { GarmentFound, SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { knownOrigin } from '../../lib/origin';

export interface GarmentPageData {
  readonly found: GarmentFound;
  /** Scheme and host, for a citation that can be followed from paper; empty where they are not known. */
  readonly origin: string;
}

interface GarmentParams {
  readonly number?: string | undefined;
  readonly version?: string | undefined;
}

export async function garmentLoader(
  catalogue: SiteCatalogue,
  params: GarmentParams,
  request: Request,
): Promise<GarmentPageData> {
  return { found: await findGarment(catalogue, params), origin: knownOrigin(new URL(request.url)) };
}

/** `:version` is a whole number from 1; anything else names nothing. */
async function findGarment(catalogue: SiteCatalogue, params: GarmentParams): Promise<GarmentFound> {
  const { number = '', version } = params;
  if (!/^[a-z0-9-]{1,80}$/.test(number)) return { found: 'nothing' };
  if (version === undefined) return catalogue.garment(number);
  if (!/^[1-9]\d{0,5}$/.test(version)) return { found: 'nothing' };
  return catalogue.garment(number, Number(version));
}
