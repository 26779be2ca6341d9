import { afterEach, expect, it, vi } from 'vitest';
import { CatalogueUnreachable, httpCatalogue } from './http-catalogue';
import { emptySearch } from './search-address';

const asked = vi.fn<typeof fetch>();
vi.stubGlobal('fetch', asked);
afterEach(() => asked.mockReset());

const answers = (status: number, body: unknown) => asked.mockResolvedValue(Response.json(body, { status }));

it('asks for a search by the address that the page itself would have', async () => {
  answers(200, { total: 0 });
  await httpCatalogue.search({
    ...emptySearch,
    kind: ['skirt', 'dress'],
    measure: [{ point: 'waist', minMm: '560', maxMm: '620' }],
  });
  expect(asked.mock.calls[0]?.[0]).toBe(
    '/api/v1/catalogue/garments?kind=dress&kind=skirt&measure=waist%3A560..620',
  );
});

it('knows a garment, a withdrawal notice and nothing apart', async () => {
  answers(200, { number: 'lh-1' });
  expect(await httpCatalogue.garment('lh-1')).toEqual({ found: 'garment', garment: { number: 'lh-1' } });
  answers(410, { number: 'lh-1', notice: 'Gone back.', withdrawnOn: '2026-05-04' });
  expect(await httpCatalogue.garment('lh-1')).toMatchObject({
    found: 'withdrawn',
    notice: { notice: 'Gone back.' },
  });
  answers(404, {});
  expect(await httpCatalogue.garment('lh-1', 3)).toEqual({ found: 'nothing' });
  expect(asked.mock.lastCall?.[0]).toBe('/api/v1/catalogue/garments/lh-1/v/3');
});

it('says so where the catalogue fails or cannot be reached', async () => {
  answers(503, {});
  await expect(httpCatalogue.front()).rejects.toThrow(new CatalogueUnreachable(503));
  asked.mockRejectedValue(new TypeError('network'));
  await expect(httpCatalogue.front()).rejects.toThrow('The catalogue did not answer.');
});
