import { join } from 'node:path';

/** Where the two applications lie once they are built. */
export interface BuiltFolders {
  /** Holds `client/` for the browser and `server/entry-server.js` for rendering. */
  readonly site: string;
  readonly workroom: string;
}

/** Injects the folders; specs hand in small ones of their own. */
export const BUILT_FOLDERS = Symbol('built-folders');

/** Three levels up is the house, from `src/pages` as from `dist/pages`. */
const house = join(__dirname, '..', '..', '..');

export const builtFolders: BuiltFolders = {
  site: join(house, 'site', 'dist'),
  workroom: join(house, 'admin', 'dist'),
};
