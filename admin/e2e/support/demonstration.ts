import fs from 'node:fs';
import type { Role } from '@ellwand/shared/records/roles';

interface Account {
  readonly role: Role;
  readonly email: string;
  readonly password: string;
}

/** The house that holds the demonstration, and whom of its staff one may sign in as; see `playwright.config.ts`. */
export function demonstrationHouse() {
  const url = variable('ELLWAND_E2E_URL').replace(/\/$/, '');
  const text = fs.readFileSync(variable('ELLWAND_E2E_DEMONSTRATION'), 'utf8');
  const { accounts } = JSON.parse(text) as { accounts: Account[] };
  return {
    url,
    account(role: Role): Account {
      const found = accounts.find((account) => account.role === role);
      if (!found) throw new Error(`The demonstration has no ${role}`);
      return found;
    },
  };
}

function variable(name: string): string {
  const value = process.env[name];
  if (value === undefined || value === '')
    throw new Error(`${name} is not set: run the journeys with npm test, or against npm start`);
  return value;
}
