import { resolve } from 'node:path';
import { z } from 'zod';

const port = z.coerce.number().int().min(1).max(65535);

const Variables = z.object({
  ELLWAND_HOST: z.string().min(1).default('127.0.0.1'),
  ELLWAND_PORT: port.default(4310),
  ELLWAND_DATA: z.string().min(1).default('.data'),
  ELLWAND_DB_HOST: z.string().min(1).default('127.0.0.1'),
  ELLWAND_DB_PORT: port,
  ELLWAND_CATALOGUE_DB_HOST: z.string().min(1).optional(),
  ELLWAND_DB_OWNER_USER: z.string().min(1).optional(),
  ELLWAND_DB_OWNER_PASSWORD: z.string().min(1).optional(),
  ELLWAND_DB_WORKROOM_USER: z.string().min(1),
  ELLWAND_DB_WORKROOM_PASSWORD: z.string().min(1),
  ELLWAND_DB_CATALOGUE_USER: z.string().min(1),
  ELLWAND_DB_CATALOGUE_PASSWORD: z.string().min(1),
  ELLWAND_SECRET: z.string().min(32, 'at least 32 characters'),
  ELLWAND_PUBLIC_URL: z.url({ protocol: /^https?$/ }).optional(),
  ELLWAND_SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  ELLWAND_MAIL_FROM: z.email().optional(),
  ELLWAND_TRUST_PROXY: z.string().optional(),
  ELLWAND_DISK_FLOOR: z.coerce
    .number()
    .int()
    .min(0)
    .default(512 * 1024 * 1024),
  ELLWAND_LOG: z.enum(['info', 'warn', 'silent']).default('info'),
});

interface DatabaseAccount {
  readonly host: string;
  readonly port: number;
  readonly username: string;
  readonly password: string;
}

/** Everything the API is told from outside, checked once at start. */
export interface Environment {
  /** Address to listen on: loopback, unless a proxy on another machine stands before it. */
  readonly host: string;
  readonly port: number;
  readonly dataFolder: string;
  readonly publicUrl: string;
  readonly secure: boolean;
  readonly secret: string;
  readonly smtpUrl: string;
  /** Sender of all letters; `workroom@` the public address's host unless given. */
  readonly mailFrom: string;
  readonly trustProxy: string | undefined;
  readonly diskFloorBytes: number;
  readonly logLevel: 'info' | 'warn' | 'silent';
  readonly owner: DatabaseAccount | undefined;
  readonly workroom: DatabaseAccount;
  readonly catalogue: DatabaseAccount;
}

/**
 * Reads the environment's variables.
 * @throws Error with one readable message that names every fault, not just the first.
 */
export function readEnvironment(variables: NodeJS.ProcessEnv): Environment {
  const parsed = Variables.safeParse(variables);
  if (!parsed.success) {
    const faults = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`Ellwand cannot start; these variables are wrong:\n${faults.join('\n')}`);
  }
  const v = parsed.data;
  const database = (username: string, password: string, host = v.ELLWAND_DB_HOST): DatabaseAccount => ({
    host,
    port: v.ELLWAND_DB_PORT,
    username,
    password,
  });
  const publicUrl = (v.ELLWAND_PUBLIC_URL ?? `http://127.0.0.1:${v.ELLWAND_PORT}`).replace(/\/$/, '');
  return {
    host: v.ELLWAND_HOST,
    port: v.ELLWAND_PORT,
    dataFolder: resolve(v.ELLWAND_DATA),
    publicUrl,
    secure: publicUrl.startsWith('https:'),
    secret: v.ELLWAND_SECRET,
    smtpUrl: v.ELLWAND_SMTP_URL,
    mailFrom: v.ELLWAND_MAIL_FROM ?? `workroom@${mailHost(publicUrl)}`,
    trustProxy: v.ELLWAND_TRUST_PROXY,
    diskFloorBytes: v.ELLWAND_DISK_FLOOR,
    logLevel: v.ELLWAND_LOG,
    owner:
      v.ELLWAND_DB_OWNER_USER && v.ELLWAND_DB_OWNER_PASSWORD
        ? database(v.ELLWAND_DB_OWNER_USER, v.ELLWAND_DB_OWNER_PASSWORD)
        : undefined,
    workroom: database(v.ELLWAND_DB_WORKROOM_USER, v.ELLWAND_DB_WORKROOM_PASSWORD),
    catalogue: database(
      v.ELLWAND_DB_CATALOGUE_USER,
      v.ELLWAND_DB_CATALOGUE_PASSWORD,
      v.ELLWAND_CATALOGUE_DB_HOST,
    ),
  };
}

/** A number or a bare name is no host that mail comes from. */
function mailHost(publicUrl: string): string {
  const { hostname } = new URL(publicUrl);
  return /\.[a-z]{2,}$/i.test(hostname) ? hostname : 'ellwand.invalid';
}
