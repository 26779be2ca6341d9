// @ts-check
/**
 * Who may do what in the database: the one place where accounts and grants are written down. Tests compare
 * SHOW GRANTS with `grantStatements` (CommonJS ones read them from `database.mjs start`).
 */

/**
 * @typedef {'owner' | 'workroom' | 'catalogue'} Role
 * @typedef {Record<Role, string>} Passwords
 * @typedef {{ user: string, on: Record<string, string[]> }} Account
 */

/** @type {readonly Role[]} */
export const roles = ['owner', 'workroom', 'catalogue'];

/** @type {Record<Role, Account>} */
export const accounts = {
  // Migrations: everything inside the three schemas, nothing outside of them, and no granting on.
  owner: {
    user: 'ellwand_owner',
    on: {
      ellwand: ['ALL PRIVILEGES'],
      ellwand_catalogue: ['ALL PRIVILEGES'],
      ellwand_audit: ['ALL PRIVILEGES'],
    },
  },
  // The Workroom at run time: no DDL; what is in the audit trail stays as it is.
  workroom: {
    user: 'ellwand_workroom',
    on: {
      ellwand: ['SELECT', 'INSERT', 'UPDATE', 'DELETE'],
      ellwand_catalogue: ['SELECT', 'INSERT', 'UPDATE', 'DELETE'],
      ellwand_audit: ['SELECT', 'INSERT'],
    },
  },
  // The public side: reads published copies, and nothing else.
  catalogue: {
    user: 'ellwand_catalogue',
    on: { ellwand_catalogue: ['SELECT'] },
  },
};

/** The server runs with --skip-name-resolve and listens on loopback only, so this is the one host there is. */
export const ACCOUNT_HOST = '127.0.0.1';

/** @type {readonly string[]} */
export const schemas = Object.keys(accounts.owner.on);

/**
 * The GRANT statements of one account, word for word as MariaDB shows them again in SHOW GRANTS.
 * @param {Role} role
 * @param {string} [suffix] of the schemas' names: a test's own set of the three
 * @returns {string[]}
 */
export function grantStatements(role, suffix = '') {
  const { user, on } = accounts[role];
  return Object.entries(on).map(
    ([schema, privileges]) =>
      `GRANT ${privileges.join(', ')} ON \`${grantPattern(schema + suffix)}\`.* TO \`${user}\`@\`${ACCOUNT_HOST}\``,
  );
}

/**
 * Statements that make the schemas and leave each account with its password and exactly its grants, whatever
 * was there before.
 * @param {Passwords} passwords letters, digits, - and _ only
 * @returns {string[]}
 */
export function accountStatements(passwords) {
  return [
    ...schemaStatements(''),
    ...roles.flatMap((role) => {
      const name = `'${accounts[role].user}'@'${ACCOUNT_HOST}'`;
      return [
        `CREATE USER IF NOT EXISTS ${name}`,
        `ALTER USER ${name} IDENTIFIED BY '${passwords[role]}'`,
        `REVOKE ALL PRIVILEGES, GRANT OPTION FROM ${name}`,
        ...grantStatements(role),
      ];
    }),
  ];
}

/**
 * Statements that make another set of the three schemas beside the first and open it to the same accounts.
 * @param {string} suffix small letters, digits and _
 * @returns {string[]}
 */
export function schemaSetStatements(suffix) {
  return [...schemaStatements(suffix), ...roles.flatMap((role) => grantStatements(role, suffix))];
}

/** @param {string} suffix */
function schemaStatements(suffix) {
  return schemas.map(
    (schema) =>
      `CREATE DATABASE IF NOT EXISTS \`${schema}${suffix}\` ` +
      'CHARACTER SET utf8mb4 COLLATE utf8mb4_uca1400_ai_ci',
  );
}

/**
 * In GRANT an underscore stands for any one letter; escaped, it is an underscore.
 * @param {string} schema
 */
function grantPattern(schema) {
  return schema.replaceAll('_', '\\_');
}
