// @ts-check
import path from 'node:path';
import { applyAccounts } from './database-accounts.mjs';
import { runAsAdministrator, startDatabase } from './database-server.mjs';
import { schemas } from './grants.mjs';
import { readHouseKind, requireSameKind, writeHouseKind } from './house-kind.mjs';
import { launchNodeService } from './node-service.mjs';
import { PlainFailure } from './plain-failure.mjs';
import { freePort } from './ports.mjs';
import { run } from './programs.mjs';
import { signingSecret } from './secrets.mjs';
import { Supervised } from './supervised.mjs';

/** Wished ports of the inner services; another free one where they are taken. */
const DATABASE_PORT = 4320;
const MAIL_SMTP_PORT = 4325;
const MAIL_INBOX_PORT = 4326;

/** The API drains for at most ten seconds by itself; then it is held up by something. */
const API_STOPS_WITHIN_MS = 10_000;
const MAIL_STOPS_WITHIN_MS = 5_000;
/** A clean stop writes all changed pages first: only a hung server takes this long. */
const DATABASE_STOPS_WITHIN_MS = 60_000;

/** @typedef {<T>(label: string, work: () => Promise<T>) => Promise<T>} Step */

/**
 * One open house: its database, mail drop and API, started in this order and stopped in the reverse.
 */
export class House {
  /** @type {Supervised[]} */
  #services = [];
  /** @type {NodeJS.ProcessEnv} */
  #env;

  /**
   * @param {string} root
   * @param {import('./settings.mjs').Settings} settings
   * @param {Step} step
   * @param {(failure: unknown) => void} giveUp called when a service can no longer be kept running
   */
  constructor(root, settings, step, giveUp) {
    this.root = root;
    this.settings = settings;
    this.step = step;
    this.giveUp = giveUp;
    this.#env = {
      ...process.env,
      NODE_ENV: 'production',
      ELLWAND_PORT: String(settings.port),
      ELLWAND_DATA: settings.dataFolder,
      ELLWAND_PUBLIC_URL: settings.publicUrl,
    };
  }

  /**
   * Opens the house and resolves once it answers.
   * @returns {Promise<Omit<import('./house-lock.mjs').Running, 'pid' | 'ready'>>} its addresses
   */
  async open() {
    const { dataFolder, empty, publicUrl, ownDatabase } = this.settings;
    const kind = readHouseKind(dataFolder);
    requireSameKind(kind, empty, dataFolder);
    this.#env.ELLWAND_SECRET ??= signingSecret(dataFolder);
    if (ownDatabase) await this.#startDatabase(kind?.filled === false);
    // Before the migrations: they read the same environment, whole, and it names the mail drop.
    const inboxUrl = await this.#startMailDrop();
    await this.#runScript('Bringing the database up to date', 'database/migrate.js');
    const opened = kind?.opened ?? (empty ? 'empty' : 'demonstration');
    if (kind?.filled !== true) await this.#fill(opened);
    await this.step('Starting Ellwand', () => this.#startApi());
    return {
      url: `${publicUrl}/`,
      workroomUrl: `${publicUrl}/workroom/`,
      inboxUrl,
      ...(opened === 'empty'
        ? { firstAdministrator: await this.#firstAdministrator() }
        : { demonstration: path.join(dataFolder, 'demonstration.json') }),
    };
  }

  /** Stops the API first, which answers what it has accepted; the database last. */
  async close() {
    for (const service of this.#services.reverse()) await service.stop();
    this.#services = [];
  }

  /** @param {boolean} startOver drop what an interrupted first filling has left */
  async #startDatabase(startOver) {
    const { dataFolder } = this.settings;
    const port = await freePort(DATABASE_PORT);
    await this.#supervise('The database', DATABASE_STOPS_WITHIN_MS, async () => {
      const database = await startDatabase({ dataFolder, port });
      if (database.remark) console.log(database.remark);
      return database.child;
    });
    if (startOver)
      await runAsAdministrator(
        dataFolder,
        schemas.map((name) => `DROP DATABASE IF EXISTS \`${name}\``),
      );
    const accounts = await applyAccounts(dataFolder);
    Object.assign(this.#env, { ELLWAND_DB_HOST: '127.0.0.1', ELLWAND_DB_PORT: String(port) });
    for (const [role, { user, password }] of Object.entries(accounts)) {
      this.#env[`ELLWAND_DB_${role.toUpperCase()}_USER`] = user;
      this.#env[`ELLWAND_DB_${role.toUpperCase()}_PASSWORD`] = password;
    }
  }

  /** @returns {Promise<string | undefined>} address of the inbox; undefined where a mail server is set */
  async #startMailDrop() {
    if (this.settings.smtpUrl !== undefined) return undefined;
    const smtp = await freePort(MAIL_SMTP_PORT);
    const inbox = await freePort(MAIL_INBOX_PORT);
    Object.assign(this.#env, {
      ELLWAND_MAIL_DROP_SMTP_PORT: String(smtp),
      ELLWAND_MAIL_DROP_HTTP_PORT: String(inbox),
      ELLWAND_SMTP_URL: `smtp://127.0.0.1:${smtp}`,
    });
    const readyUrl = `http://127.0.0.1:${inbox}/`;
    await this.#superviseScript('The mail drop', MAIL_STOPS_WITHIN_MS, 'mail/drop.js', readyUrl);
    return readyUrl;
  }

  async #startApi() {
    const readyUrl = `http://127.0.0.1:${this.settings.port}/health/ready`;
    await this.#superviseScript('The API', API_STOPS_WITHIN_MS, 'main.js', readyUrl);
  }

  /**
   * Marks the house before and after: an interrupted filling is started over, and nobody has seen it until then.
   * @param {'demonstration' | 'empty'} opened
   */
  async #fill(opened) {
    writeHouseKind(this.settings.dataFolder, { opened, filled: false });
    if (opened === 'demonstration') {
      // It takes minutes and says itself how far it is.
      await this.#runScript('Filling the demonstration', 'demonstration/load.js', (text) =>
        process.stdout.write(text),
      );
    }
    writeHouseKind(this.settings.dataFolder, { opened, filled: true });
  }

  /** @returns {Promise<string | undefined>} undefined once there is an administrator */
  async #firstAdministrator() {
    const said = await this.#runScript('Looking for an administrator', 'auth/first-administrator.js');
    return /https?:\/\/\S+/.exec(said)?.[0];
  }

  /**
   * @param {string} label
   * @param {string} script below api/dist
   * @param {(text: string) => void} [onOutput] hears what it prints while it prints
   * @returns {Promise<string>} what it printed
   */
  async #runScript(label, script, onOutput) {
    const { code, output } = await this.step(label, () =>
      run(process.execPath, ['--enable-source-maps', this.#built(script)], {
        cwd: this.root,
        env: this.#env,
        onOutput,
      }),
    );
    if (code !== 0) throw new PlainFailure(`${label} failed.`, { detail: output.slice(-4000) });
    return output;
  }

  /**
   * @param {string} name
   * @param {number} stopWithinMs
   * @param {string} script below api/dist
   * @param {string} readyUrl
   */
  async #superviseScript(name, stopWithinMs, script, readyUrl) {
    const log = path.join(this.settings.dataFolder, 'logs', `${path.basename(script, '.js')}.log`);
    const service = { name, script: this.#built(script), root: this.root, env: this.#env, log, readyUrl };
    await this.#supervise(name, stopWithinMs, () => launchNodeService(service));
  }

  /**
   * @param {string} name
   * @param {number} stopWithinMs
   * @param {() => Promise<import('node:child_process').ChildProcess>} launch
   */
  async #supervise(name, stopWithinMs, launch) {
    const service = new Supervised({ name, stopWithinMs, launch }, this.giveUp);
    this.#services.push(service);
    await service.start();
  }

  /** @param {string} script */
  #built(script) {
    return path.join(this.root, 'api', 'dist', script);
  }
}
