import { RequestMethod } from '@nestjs/common';
import { METHOD_METADATA, PATH_METADATA, ROUTE_ARGS_METADATA } from '@nestjs/common/constants';
import { RouteParamtypes } from '@nestjs/common/enums/route-paramtypes.enum';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';
import type { ZodDto } from 'nestjs-zod';
import { z } from 'zod';
import { type House, openHouse } from './harness/house';

interface Input {
  readonly where: string;
  readonly kind: 'body' | 'query' | 'path';
  readonly dto: unknown;
}

const kinds = new Map<number, Input['kind']>([
  [RouteParamtypes.BODY, 'body'],
  [RouteParamtypes.QUERY, 'query'],
  [RouteParamtypes.PARAM, 'path'],
]);

/** An address that cannot be a picture's is no bad request: it is not there. The route reads it by itself. */
const readByHand = ['PublicPicturesController.picture (GET) path'];

describe('whatever a route takes from outside (ASVS 2.2.1, 15.3.3)', () => {
  let house: House;
  let inputs: Input[];
  beforeAll(async () => {
    house = await openHouse();
    inputs = house.app
      .get(DiscoveryService, { strict: false })
      .getControllers()
      .flatMap(({ metatype }) => (metatype ? inputsOf(metatype as Controller) : []));
  });
  afterAll(() => house.close());

  it('is checked against a schema', () => {
    expect(inputs.length).toBeGreaterThan(30);
    const unchecked = inputs.filter(({ dto, where }) => !isDto(dto) && !readByHand.includes(where));
    expect(unchecked.map(({ where }) => where)).toEqual([]);
  });

  it('holds in its body no field that the schema does not name', () => {
    const bodies = inputs.filter(({ kind }) => kind === 'body');
    const lax = bodies.filter(({ dto }) => isDto(dto) && !refusesUnknown(dto.schema));
    expect(lax.map(({ where }) => where)).toEqual([]);
  });

  it('cannot reach prototypes, whatever its form', async () => {
    const agent = house.visitor();
    const bodies = [
      '{"email":"a@larkmoor.example","password":"x","__proto__":{"roles":["administrator"]}}',
      '{"email":"a@larkmoor.example","password":"x","constructor":{"prototype":{"admin":true}}}',
      '{"email":{"__proto__":{"toString":1}},"password":"x"}',
      `${'['.repeat(100_000)}${']'.repeat(100_000)}`,
      '"text"',
      'null',
    ];
    for (const body of bodies) {
      const answer = await agent.post('/api/v1/session').set('Content-Type', 'application/json').send(body);
      expect({ body: body.slice(0, 60), status: answer.status }).toEqual({
        body: body.slice(0, 60),
        status: 400,
      });
    }
    expect(({} as Record<string, unknown>)['admin']).toBeUndefined();
  });
});

type Controller = abstract new (...args: never[]) => object;

function inputsOf(controller: Controller): Input[] {
  const methods = controller.prototype as Record<string, object>;
  return new MetadataScanner()
    .getAllMethodNames(controller.prototype as object)
    .filter((name) => Reflect.hasMetadata(PATH_METADATA, methods[name] ?? {}))
    .flatMap((name) => {
      const args = (Reflect.getMetadata(ROUTE_ARGS_METADATA, controller, name) ?? {}) as Record<
        string,
        { index: number }
      >;
      const types = Reflect.getMetadata('design:paramtypes', methods, name) as readonly unknown[];
      const method = RequestMethod[Reflect.getMetadata(METHOD_METADATA, methods[name] ?? {}) as number];
      return Object.entries(args).flatMap(([key, { index }]) => {
        const kind = kinds.get(Number(key.split(':')[0]));
        return kind
          ? [{ where: `${controller.name}.${name} (${method}) ${kind}`, kind, dto: types[index] }]
          : [];
      });
    });
}

const isDto = (type: unknown): type is ZodDto => typeof type === 'function' && 'isZodDto' in type;

/** A schema says so itself, in the language that the API's description is written in. */
function refusesUnknown(schema: unknown): boolean {
  const described = z.toJSONSchema(schema as z.ZodType, { io: 'input', unrepresentable: 'any' });
  const alternatives = described.anyOf ?? described.oneOf ?? [described];
  return alternatives.every(
    (each) =>
      typeof each === 'object' && 'additionalProperties' in each && each.additionalProperties === false,
  );
}
