/** Where the empty house of the journeys is; see `playwright.config.ts`. */
export interface EmptyHouse {
  readonly url: string;
  readonly inboxUrl: string;
  readonly firstAdministrator: string;
}

export function emptyHouse(): EmptyHouse {
  return {
    url: variable('ELLWAND_E2E_EMPTY_URL').replace(/\/$/, ''),
    inboxUrl: variable('ELLWAND_E2E_EMPTY_INBOX_URL'),
    firstAdministrator: variable('ELLWAND_E2E_FIRST_ADMINISTRATOR'),
  };
}

function variable(name: string): string {
  const value = process.env[name];
  if (value === undefined || value === '')
    throw new Error(`${name} is not set: run the journeys with npm test`);
  return value;
}
