// @ts-check
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
];
