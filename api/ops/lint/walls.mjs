// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { root } from '../lib/places.mjs';

/**
 * The walls between rooms: who may not import from where. Each zone is a rule of
 * `import-x/no-restricted-paths`; `walls.spec.ts` lints a violation of each.
 * @type {{ target: string, from: string, except?: string[], message: string }[]}
 */
export const walls = [
  {
    target: './shared/src',
    from: '.',
    except: ['./shared', './node_modules'],
    message: 'shared knows no application.',
  },
  {
    target: './api/src/catalogue',
    from: './api/src',
    except: ['./catalogue', './common'],
    message:
      'The public side reads published copies only: catalogue imports common and shared, nothing else.',
  },
  {
    target: './api/src/common',
    from: './api/src',
    except: ['./common'],
    message: 'common stands below every room.',
  },
  { target: './site', from: './admin', message: 'The public site and the Workroom share only shared.' },
  { target: './admin', from: './site', message: 'The public site and the Workroom share only shared.' },
  { target: './site/src', from: './api', message: 'The site meets the API over its contract, in shared.' },
  { target: './admin/src', from: './api', message: 'The Workroom meets the API over HTTP.' },
  // What a feature asks the API is anybody's; its screens and its reasoning are its own.
  ...featureWalls(
    './admin/src/features',
    ['api'],
    'A feature of the Workroom uses no more of another than its api/.',
  ),
  ...featureWalls(
    './site/src/features',
    [],
    'Features of the site share components and lib, not one another.',
  ),
];

/**
 * One wall around each feature: the others may only come in by the folders that are open.
 * @param {string} folder of the features, from the root
 * @param {string[]} open folders of a feature
 * @param {string} message
 */
function featureWalls(folder, open, message) {
  const features = fs.readdirSync(path.join(root, folder)).sort();
  return features.map((feature) => ({
    target: `${folder}/${feature}`,
    from: folder,
    except: [`./${feature}`, ...features.flatMap((other) => open.map((name) => `./${other}/${name}`))],
    message,
  }));
}
