import { doors } from './doors/doors';
import { type House, openHouse } from './harness/house';

interface Operation {
  readonly operationId: string;
  readonly responses: Readonly<Record<string, unknown>>;
  readonly parameters?: readonly { readonly name: string; readonly in: string }[];
  readonly 'x-entry': string;
}
interface Description {
  readonly openapi: string;
  readonly info: { readonly title: string; readonly version: string };
  readonly paths: Readonly<Record<string, Readonly<Record<string, Operation>>>>;
}

describe('the API’s description of itself', () => {
  let house: House;
  let description: Description;
  beforeAll(async () => {
    house = await openHouse();
    description = (await house.visitor().get('/api/openapi.json')).body as Description;
  });
  afterAll(() => house.close());

  const operations = () =>
    Object.entries(description.paths).flatMap(([address, path]) =>
      Object.entries(path).map(([method, operation]) => ({ method, address, operation })),
    );

  it('is OpenAPI 3.1, of this application', () => {
    expect(description.openapi).toBe('3.1.0');
    expect(description.info).toMatchObject({ title: 'Ellwand', version: '1' });
  });

  it('names every route of the API, and who may enter', () => {
    const described = operations().map(({ method, address, operation }) => [
      `${method.toUpperCase()} ${address.replaceAll(/\{(\w+)\}/g, ':$1')}`,
      operation['x-entry'],
    ]);
    const wanted = Object.entries(doors).filter(
      ([route]) => !/ \/(api\/(docs|openapi)|workroom|\{)/.test(route),
    );
    expect(described.sort()).toEqual(wanted.map(([route, door]) => [route, door]).sort());
  });

  it('points at nothing that is not there', () => {
    const text = JSON.stringify(description);
    const pointers = [...text.matchAll(/"\$ref":"#\/([^"]+)"/g)].map((match) => match[1] ?? '');
    expect(pointers.length).toBeGreaterThan(20);
    for (const pointer of pointers) {
      const found = pointer
        .split('/')
        .reduce<unknown>(
          (place, step) => (place as Record<string, unknown> | undefined)?.[step],
          description,
        );
      expect({ pointer, found: typeof found }).toEqual({ pointer, found: 'object' });
    }
  });

  it('describes each operation once, with its parameters, its answer and the form of its refusals', () => {
    const ids = operations().map(({ operation }) => operation.operationId);
    expect(new Set(ids).size).toBe(ids.length);
    for (const { address, operation } of operations()) {
      const inAddress = [...address.matchAll(/\{(\w+)\}/g)].map((match) => match[1]);
      const declared = (operation.parameters ?? [])
        .filter((each) => each.in === 'path')
        .map(({ name }) => name);
      expect({ address, declared: declared.sort() }).toEqual({ address, declared: inAddress.sort() });
      expect(Object.keys(operation.responses)).toContain('default');
      expect(Object.keys(operation.responses).some((status) => status.startsWith('2'))).toBe(true);
    }
  });

  it('is there for people as a page without scripts', async () => {
    const page = await house.visitor().get('/api/docs');
    expect(page.type).toBe('text/html');
    expect(page.text).toContain('/api/v1/workroom/garments/{id}/publish');
    expect(page.text).not.toMatch(/<script|style=/);
    expect((await house.visitor().get('/api/docs.css')).type).toBe('text/css');
  });
});
