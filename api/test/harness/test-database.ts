/** One line of JSON as `api/ops/database.mjs start` prints it; also where a runner hands over its own server. */
export const DATABASE_VARIABLE = 'ELLWAND_TEST_DATABASE';

/** Data folder of a server that this run has started itself, and so must stop. */
export const OWN_FOLDER_VARIABLE = 'ELLWAND_TEST_DATABASE_FOLDER';

interface TestAccount {
  readonly user: string;
  readonly password: string;
  /** The lines that SHOW GRANTS must answer beside USAGE. */
  readonly grants: readonly string[];
}

export interface TestDatabase {
  readonly port: number;
  readonly accounts: Readonly<Record<'owner' | 'workroom' | 'catalogue', TestAccount>>;
}

/** @throws Error where the global set-up has not run. */
export function testDatabase(): TestDatabase {
  const text = process.env[DATABASE_VARIABLE];
  if (!text) throw new Error(`${DATABASE_VARIABLE} is not set: run these specs through api/jest.config.cjs`);
  return JSON.parse(text) as TestDatabase;
}
