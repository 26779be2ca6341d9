import { PUBLIC_ROUTE } from './public.decorator';
import { REQUIRED_PERMISSION, type Requirement } from './requires.decorator';

/** Who may enter a route: everyone, whoever meets the requirement, or nobody where nothing is said. */
export type Entry = 'public' | Requirement | 'nobody';

/**
 * What is said at the handler goes before what is said at its controller.
 * @param handler the controller's method, @param controller its class: as Nest's execution context hands them out
 */
export function entryOf(handler: object, controller: object): Entry {
  for (const place of [handler, controller]) {
    const requirement = Reflect.getMetadata(REQUIRED_PERMISSION, place) as Requirement | undefined;
    if (requirement !== undefined) return requirement;
    if (Reflect.getMetadata(PUBLIC_ROUTE, place) === true) return 'public';
  }
  return 'nobody';
}
