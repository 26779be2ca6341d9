import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Role } from '@ellwand/shared/records/roles';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import supertest from 'supertest';
import { AppModule } from '../../src/app.module';
import { applicationOptions, furnish } from '../../src/application';
import { PASSWORD_COST } from '../../src/auth/passwords.service';
import { cookieNames } from '../../src/auth/session-cookies';
import { Sessions } from '../../src/auth/sessions.service';
import { Clock } from '../../src/common/clock';
import { ENVIRONMENT } from '../../src/common/environment.token';
import { type Limits, LIMITS } from '../../src/common/limits';
import { Work } from '../../src/common/work';
import { type Environment, readEnvironment } from '../../src/config/environment';
import { BUILT_FOLDERS, type BuiltFolders } from '../../src/pages/built-folders';
import { MailDispatcher } from '../../src/mail/dispatcher.service';
import { type Letter, MailSink } from './mail-sink';
import { Owner } from './owner';
import { insertPerson, type TestPerson } from './people';
import { SettableClock } from './settable-clock';
import { testDatabase } from './test-database';

export type Agent = ReturnType<typeof supertest.agent>;

/** bcrypt's lowest: tests sign in by the dozen. */
const testCost = 4;
const unlimited: Limits = { public: 1e6, workroom: 1e6, 'sign-in': 1e6, upload: 1e6 };

export interface HouseOptions {
  /** Limits of requests per address and minute; none unless given. */
  readonly limits?: Limits;
  /** Further environment variables, such as ELLWAND_PUBLIC_URL. */
  readonly variables?: Readonly<Record<string, string>>;
  /** The two built applications; as before anything is built unless given. */
  readonly built?: BuiltFolders;
}

/** The whole application on a free port of loopback, with a real database, a clock to set, and its letters caught. */
export class House {
  constructor(
    readonly app: NestExpressApplication,
    readonly environment: Environment,
    readonly clock: SettableClock,
    readonly mail: MailSink,
    readonly owner: Owner,
  ) {}

  /** Where it listens: `http://127.0.0.1:<port>`. */
  get url(): string {
    return `http://127.0.0.1:${this.environment.port}`;
  }

  /** Somebody without an account, whose browser sends the Origin of our own pages. */
  visitor(): Agent {
    return supertest.agent(this.url).set('Origin', new URL(this.environment.publicUrl).origin);
  }

  person(role: Role | readonly Role[], name?: string): Promise<TestPerson> {
    return insertPerson(this.app, role, name);
  }

  /** Somebody signed in: the cookies are in the agent's jar. Sign-in itself has specs of its own. */
  async signInAs(who: Role | TestPerson): Promise<Agent> {
    const person = typeof who === 'string' ? await this.person(who) : who;
    const tokens = await this.app.get(Work).run((tx) => this.app.get(Sessions).open(tx, person.id, 'specs'));
    const names = cookieNames(this.environment.secure);
    const agent = this.visitor();
    agent.jar.setCookies([
      `${names.access}=${tokens.accessToken}; path=/; domain=127.0.0.1`,
      `${names.refresh}=${tokens.refreshToken}; path=/; domain=127.0.0.1`,
    ]);
    return agent;
  }

  /** Sends what is due, and hands over every letter caught since the house was emptied. */
  async inbox(): Promise<readonly Letter[]> {
    await this.app.get(MailDispatcher).dispatchDue();
    return this.mail.letters;
  }

  /**
   * The secret of the one-time link in the latest letter to somebody.
   * @throws Error where there is no such letter
   */
  async tokenFor(email: string): Promise<string> {
    const letters = (await this.inbox()).filter(({ recipients }) => recipients.includes(email));
    const token = /#([\w-]{43})/.exec(letters.at(-1)?.mail.text ?? '')?.[1];
    if (!token) throw new Error(`No letter with a link has come for ${email}`);
    return token;
  }

  /** Leaves no row in any table, no letter, and the clock right. */
  async empty(): Promise<void> {
    await this.owner.empty();
    this.mail.letters.length = 0;
    this.mail.refuse = false;
    this.clock.reset();
  }

  async close(): Promise<void> {
    await this.app.close();
    await this.owner.close();
    await this.mail.close();
    await rm(this.environment.dataFolder, { recursive: true, force: true });
  }
}

/** Opens a house for the specs of one file; `close()` it in afterAll. */
export async function openHouse(options: HouseOptions = {}): Promise<House> {
  const mail = new MailSink();
  const environment = readEnvironment({
    ...(await houseVariables(await mail.open())),
    ...options.variables,
  });
  const owner = await Owner.open(environment);
  await owner.empty();
  const clock = new SettableClock();
  const room = await Test.createTestingModule({ imports: [AppModule] })
    .overrideProvider(ENVIRONMENT)
    .useValue(environment)
    .overrideProvider(Clock)
    .useValue(clock)
    .overrideProvider(PASSWORD_COST)
    .useValue(testCost)
    .overrideProvider(LIMITS)
    .useValue(options.limits ?? unlimited)
    .overrideProvider(BUILT_FOLDERS)
    .useValue(options.built ?? notBuilt(environment))
    .compile();
  const app = room.createNestApplication<NestExpressApplication>(applicationOptions);
  furnish(app);
  await app.listen(environment.port, '127.0.0.1');
  return new House(app, environment, clock, mail, owner);
}

/** As in a house where nothing has been built yet. */
const notBuilt = ({ dataFolder }: Environment): BuiltFolders => ({
  site: join(dataFolder, 'site-not-built'),
  workroom: join(dataFolder, 'workroom-not-built'),
});

/** The variables of a house of its own, for `readEnvironment` or for a process. */
export async function houseVariables(smtpPort: number): Promise<Record<string, string>> {
  const { port, accounts } = testDatabase();
  return {
    ELLWAND_PORT: String(await freePort()),
    ELLWAND_DATA: await mkdtemp(join(tmpdir(), 'ellwand-house-')),
    ELLWAND_DB_PORT: String(port),
    ELLWAND_DB_OWNER_USER: accounts.owner.user,
    ELLWAND_DB_OWNER_PASSWORD: accounts.owner.password,
    ELLWAND_DB_WORKROOM_USER: accounts.workroom.user,
    ELLWAND_DB_WORKROOM_PASSWORD: accounts.workroom.password,
    ELLWAND_DB_CATALOGUE_USER: accounts.catalogue.user,
    ELLWAND_DB_CATALOGUE_PASSWORD: accounts.catalogue.password,
    ELLWAND_SECRET: 'a secret of the specs and of nothing else',
    ELLWAND_SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    ELLWAND_LOG: 'silent',
    ELLWAND_DISK_FLOOR: '0',
  };
}

export async function freePort(): Promise<number> {
  const server = createServer();
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  await new Promise((resolve) => server.close(resolve));
  return port;
}
