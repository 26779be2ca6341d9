import { Controller, Get, Post } from '@nestjs/common';
import { type DiscoveryService, MetadataScanner } from '@nestjs/core';
import { entryOf } from '../common/entry';
import { Public } from '../common/public.decorator';
import { Requires } from '../common/requires.decorator';
import { EveryRouteDecided } from './every-route-decided';

@Controller()
class Hall {
  @Get('open')
  @Public()
  open() {
    return 'open';
  }

  @Post('kept')
  @Requires('user:manage')
  kept() {
    return 'kept';
  }

  @Get('forgotten')
  forgotten() {
    return 'forgotten';
  }

  helper() {
    return 'no route';
  }
}

@Public()
@Controller()
class Garden {
  @Get('bench')
  bench() {
    return 'bench';
  }

  @Get('shed')
  @Requires('garment:write')
  shed() {
    return 'shed';
  }
}

const checking = (...controllers: object[]) => {
  const discovery: Pick<DiscoveryService, 'getControllers'> = {
    getControllers: () =>
      controllers.map((metatype) => ({ metatype })) as ReturnType<DiscoveryService['getControllers']>,
  };
  return new EveryRouteDecided(discovery as DiscoveryService, new MetadataScanner());
};

describe('a route that does not say who may enter', () => {
  it('keeps the application from starting, by its name', () => {
    expect(() => checking(Garden, Hall).onModuleInit()).toThrow(
      'Say @Public() or @Requires(…) at these routes: Hall.forgotten',
    );
  });

  it('is none where the controller says it for all of its routes', () => {
    expect(() => checking(Garden).onModuleInit()).not.toThrow();
  });

  it('lets nobody in', () => {
    const entry = (controller: { prototype: object }, name: string) =>
      entryOf(Reflect.get(controller.prototype, name) as object, controller);
    expect(entry(Hall, 'forgotten')).toBe('nobody');
    expect(entry(Hall, 'open')).toBe('public');
    expect(entry(Hall, 'kept')).toBe('user:manage');
    expect(entry(Garden, 'bench')).toBe('public');
    // What is said at the route goes before what is said at its controller.
    expect(entry(Garden, 'shed')).toBe('garment:write');
  });
});
