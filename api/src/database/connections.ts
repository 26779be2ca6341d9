import type { DataSourceOptions } from 'typeorm';
import type { Environment } from '../config/environment';
import { AuditEntryRow } from '../audit/audit-entry.entity';
import { SessionRow } from '../auth/session.entity';
import { SignInSlowdown } from '../auth/sign-in-slowdown.entity';
import { GarmentEditor } from '../garments/garment-editor.entity';
import { GarmentRow } from '../garments/garment.entity';
import { PartRow } from '../garments/part.entity';
import { MailOutboxRow } from '../mail/mail-outbox.entity';
import { CutSheetRow } from '../measuring/cut-sheets/cut-sheet.entity';
import { FindingAnswerRow } from '../measuring/findings/finding-answer.entity';
import { ProtocolRow } from '../measuring/protocols/protocol.entity';
import { ReadingRow } from '../measuring/readings/reading.entity';
import { SheetPersonRow } from '../measuring/sheets/sheet-person.entity';
import { SheetRow } from '../measuring/sheets/sheet.entity';
import { TableNoteRow } from '../measuring/table-notes/table-note.entity';
import { ImageRow } from '../media/image.entity';
import { RevisionRow } from '../publishing/revision.entity';
import { InvitationRow } from '../users/invitation.entity';
import { SettingRow } from '../users/setting.entity';
import { UserRow } from '../users/user.entity';
import { guardedDriver } from './guarded-pool';
import { AuditTrail1764550000001 } from './migrations/1764550000001-audit-trail';
import { Catalogue1764550000002 } from './migrations/1764550000002-catalogue';
import { AtTheTable1764560000000 } from './migrations/1764560000000-at-the-table';
import { Protocols1764560000001 } from './migrations/1764560000001-protocols';
import { CutSheet1764560000002 } from './migrations/1764560000002-cut-sheet';
import { OverTheYears1764560000003 } from './migrations/1764560000003-over-the-years';
import { Workroom1764550000000 } from './migrations/1764550000000-workroom';

const entities = [
  AuditEntryRow,
  CutSheetRow,
  FindingAnswerRow,
  GarmentEditor,
  GarmentRow,
  ImageRow,
  InvitationRow,
  MailOutboxRow,
  PartRow,
  ProtocolRow,
  ReadingRow,
  RevisionRow,
  SessionRow,
  SettingRow,
  SheetPersonRow,
  SheetRow,
  SignInSlowdown,
  TableNoteRow,
  UserRow,
];

/** In the order in which they run. */
export const migrations = [
  Workroom1764550000000,
  AuditTrail1764550000001,
  Catalogue1764550000002,
  AtTheTable1764560000000,
  Protocols1764560000001,
  CutSheet1764560000002,
  OverTheYears1764560000003,
];

/** For the handshake; how long somebody waits for a free connection is the pool's own affair. */
const connectWithinMs = 5_000;

function mariadb(account: Environment['workroom'], database: string, connections: number) {
  return {
    type: 'mariadb',
    host: account.host,
    port: account.port,
    username: account.username,
    password: account.password,
    database,
    charset: 'utf8mb4',
    timezone: 'Z',
    synchronize: false,
    supportBigNumbers: true,
    bigNumberStrings: true,
    connectTimeout: connectWithinMs,
    poolSize: connections,
    extra: {
      waitForConnections: true,
      queueLimit: 200,
      // The count of rows that a statement has changed, not of those that it found.
      flags: ['-FOUND_ROWS'],
    },
  } as const;
}

export const workroomConnection = (environment: Environment): DataSourceOptions => ({
  ...mariadb(environment.workroom, 'ellwand', 10),
  driver: guardedDriver,
  entities,
});

/** Reads published tables only. The name must be in the result too, or Nest cannot close the connection. */
export const catalogueConnection = (environment: Environment) => ({
  ...mariadb(environment.catalogue, 'ellwand_catalogue', 10),
  driver: guardedDriver,
  name: 'catalogue',
  entities: [],
});

/** The owner's connection: migrations and nothing else. */
export function ownerConnection(environment: Environment): DataSourceOptions {
  if (!environment.owner)
    throw new Error('Migrations need ELLWAND_DB_OWNER_USER and ELLWAND_DB_OWNER_PASSWORD');
  return {
    ...mariadb(environment.owner, 'ellwand', 2),
    entities: [],
    migrations,
    migrationsTableName: 'migration',
    migrationsTransactionMode: 'none',
  };
}
