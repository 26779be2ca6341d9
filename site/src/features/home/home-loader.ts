import type { CatalogueFront, SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import type { DrawnSubject } from './drawn-subject';

export interface HomeFound extends CatalogueFront {
  readonly subject: DrawnSubject;
}

/** The front page's figures, and which of its garments is drawn. */
export async function homeLoader(catalogue: SiteCatalogue): Promise<HomeFound> {
  const front = await catalogue.front();
  // Fetched only here: a page that was sent already holds the answer.
  const { chooseSubject } = await import('./drawn-subject');
  return { ...front, subject: chooseSubject(front.newest) };
}
