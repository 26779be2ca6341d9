import { Injectable, type OnModuleInit } from '@nestjs/common';
import { PATH_METADATA } from '@nestjs/common/constants';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';
import { entryOf } from '../common/entry';

/** Keeps the application from starting where a route does not say who may enter. */
@Injectable()
export class EveryRouteDecided implements OnModuleInit {
  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
  ) {}

  onModuleInit(): void {
    const controllers = this.discovery.getControllers().flatMap(({ metatype }) => metatype ?? []);
    const undecided = controllers.flatMap((controller) =>
      undecidedRoutes(controller as { name: string; prototype: object }, this.scanner),
    );
    if (undecided.length > 0) {
      throw new Error(`Say @Public() or @Requires(…) at these routes: ${undecided.join(', ')}`);
    }
  }
}

/** @returns names of the methods that answer a route which neither they nor their controller open to anybody */
export function undecidedRoutes(
  controller: { readonly name: string; readonly prototype: object },
  scanner: MetadataScanner,
): string[] {
  const methods = controller.prototype as Record<string, unknown>;
  return scanner
    .getAllMethodNames(controller.prototype)
    .filter((name) => {
      const handler = methods[name];
      if (typeof handler !== 'function' || !Reflect.hasMetadata(PATH_METADATA, handler)) return false;
      return entryOf(handler, controller) === 'nobody';
    })
    .map((name) => `${controller.name}.${name}`);
}
