import { InjectDataSource } from '@nestjs/typeorm';

/** Name of the connection whose account may only SELECT from the published tables. */
export const CATALOGUE = 'catalogue';

/**
 * Injects the catalogue's read-only connection. The public side takes it from here and nowhere else: an
 * `@InjectDataSource()` without the name would silently hand out the Workroom's account.
 */
export const InjectCatalogue = () => InjectDataSource(CATALOGUE);
