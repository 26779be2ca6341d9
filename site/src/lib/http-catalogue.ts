import type { CatalogueFront, GarmentFound, SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import type {
  PublishedGarment,
  SearchAnswer,
  WithdrawalNotice,
} from '@ellwand/shared/records/published-garment';
import { searchParams } from './search-address';

const BASE = '/api/v1/catalogue';

/** The catalogue did not answer, or not with what was asked for. */
export class CatalogueUnreachable extends Error {
  override readonly name = 'CatalogueUnreachable';

  constructor(readonly status: number | null) {
    super(status === null ? 'The catalogue did not answer.' : `The catalogue answered ${status}.`);
  }
}

async function ask(address: string): Promise<Response> {
  try {
    return await fetch(`${BASE}${address}`, { headers: { Accept: 'application/json' } });
  } catch {
    throw new CatalogueUnreachable(null);
  }
}

async function body<T>(response: Response): Promise<T> {
  if (!response.ok) throw new CatalogueUnreachable(response.status);
  return (await response.json()) as T;
}

/** The catalogue asked over HTTP: the browser's side of what the server is handed in process. */
export const httpCatalogue: SiteCatalogue = {
  async search(query) {
    return body<SearchAnswer>(await ask(`/garments?${searchParams(query).toString()}`));
  },

  async garment(number, version): Promise<GarmentFound> {
    const path = `/garments/${encodeURIComponent(number)}`;
    const response = await ask(version === undefined ? path : `${path}/v/${version}`);
    if (response.status === 404) return { found: 'nothing' };
    if (response.status === 410) {
      return { found: 'withdrawn', notice: (await response.json()) as WithdrawalNotice };
    }
    return { found: 'garment', garment: await body<PublishedGarment>(response) };
  },

  async front() {
    return body<CatalogueFront>(await ask('/front'));
  },
};
