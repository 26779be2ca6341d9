import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiExtension } from '@nestjs/swagger';

export const PUBLIC_ROUTE = 'ellwand:public';

/** Says aloud that a route needs no account. A route that says neither this nor `@Requires` refuses everyone. */
export const Public = () =>
  applyDecorators(SetMetadata(PUBLIC_ROUTE, true), ApiExtension('x-entry', 'public'));
