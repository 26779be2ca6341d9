import { SetMetadata } from '@nestjs/common';

export const PUBLIC_ROUTE = 'ellwand:public';

/** Says aloud that a route needs no account. A route that says neither this nor `@Requires` refuses everyone. */
export const Public = () => SetMetadata(PUBLIC_ROUTE, true);
