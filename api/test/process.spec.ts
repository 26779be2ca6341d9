import { connect } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import { rm } from 'node:fs/promises';
import { readEnvironment } from '../src/config/environment';
import { houseVariables } from './harness/house';
import { Owner } from './harness/owner';
import { Program } from './harness/program';

/** Nothing listens there: letters stay in the outbox. */
const noSmtp = 9;

describe('the API as a process', () => {
  let variables: Record<string, string>;
  let program: Program | undefined;
  beforeAll(async () => {
    variables = await houseVariables(noSmtp);
    const owner = await Owner.open(readEnvironment(variables));
    await owner.empty();
    await owner.close();
  });
  afterEach(async () => {
    program?.kill();
    await program?.ended();
  });
  afterAll(() => rm(variables.ELLWAND_DATA ?? '', { recursive: true, force: true }));

  const url = (path: string) => `http://127.0.0.1:${variables.ELLWAND_PORT ?? ''}${path}`;
  const status = (path: string) =>
    fetch(url(path)).then(
      (answer) => answer.status,
      () => 0,
    );

  async function open(changes: Record<string, string> = {}): Promise<Program> {
    const opened = Program.run('main.ts', { ...variables, ...changes });
    program = opened;
    await opened.until(async () => (await status('/health/ready')) === 200);
    return opened;
  }

  it('names every variable that is wrong, in one message, and does not start', async () => {
    program = Program.run('main.ts', { ELLWAND_PORT: 'x', ELLWAND_DB_PORT: '3306', ELLWAND_SECRET: 'short' });
    expect(await program.ended()).toBe(1);
    expect(program.output).toMatch(/^Ellwand cannot start; these variables are wrong:$/m);
    for (const name of ['ELLWAND_PORT', 'ELLWAND_SECRET', 'ELLWAND_DB_WORKROOM_USER', 'ELLWAND_SMTP_URL']) {
      expect(program.output).toContain(`  ${name}: `);
    }
    expect(program.output).not.toContain('    at ');
  });

  it('says in a sentence that its port is taken', async () => {
    await open();
    const second = Program.run('main.ts', variables);
    expect(await second.ended()).toBe(1);
    expect(second.output).toMatch(/^Port \d+ is taken: /m);
    expect(second.output).not.toContain('    at ');
  });

  it('answers what it has accepted before it goes, and takes nothing new', async () => {
    const running = await open();
    const slow = await beginRequest(Number(variables.ELLWAND_PORT));
    running.child.kill('SIGTERM');
    await running.until(async () => (await status('/health/live')) === 0);
    slow.finish();
    expect(await slow.answer).toMatch(/^HTTP\/1\.1 401 .*\r\nConnection: close\r\n/s);
    expect(await running.ended()).toBe(0);
  });

  it('does not wait for idle connections', async () => {
    const running = await open();
    const idle = connect(Number(variables.ELLWAND_PORT), '127.0.0.1');
    await wait(200);
    const began = Date.now();
    running.child.kill('SIGTERM');
    expect(await running.ended()).toBe(0);
    expect(Date.now() - began).toBeLessThan(2_000);
    idle.destroy();
  });

  it('cuts a request off that never ends, and is gone within ten seconds', async () => {
    const running = await open();
    await beginRequest(Number(variables.ELLWAND_PORT));
    const began = Date.now();
    running.child.kill('SIGTERM');
    await running.ended();
    expect(Date.now() - began).toBeGreaterThan(7_000);
    expect(Date.now() - began).toBeLessThan(10_500);
  });

  it('prints one address for the first administrator, by which one comes in, and none afterwards', async () => {
    await open();
    const printed = Program.run('auth/first-administrator.ts', variables);
    expect(await printed.ended()).toBe(0);
    const token = /\/workroom\/first-administrator#([\w-]{43})\n$/.exec(printed.output)?.[1];
    const answer = await fetch(url('/api/v1/first-administrator'), {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', Origin: url('') },
      body: JSON.stringify({
        token,
        name: 'Tamsin Hale',
        email: 'tamsin.hale@larkmoor.example',
        password: 'oyster thimble lantern',
      }),
    });
    expect(answer.status).toBe(200);
    const again = Program.run('auth/first-administrator.ts', variables);
    expect(await again.ended()).toBe(0);
    expect(again.output).toBe('');
  });

  it('logs requests without anything that tells of a person (ASVS 16.2.5)', async () => {
    const running = await open({ ELLWAND_LOG: 'info' });
    await fetch(url('/api/v1/session?word=canary-query'), {
      method: 'POST',
      headers: {
        'Content-Type': 'application/json',
        Origin: url(''),
        'User-Agent': 'canary-agent',
        Cookie: 'ellwand-access=canary-cookie',
      },
      body: JSON.stringify({ email: 'canary@larkmoor.example', password: 'canary-password' }),
    });
    await running.until(() => running.output.includes('"path":"/api/v1/session"'));
    expect(running.output).not.toMatch(/canary|127\.0\.0\.1:?\d*"/);
    const line = running.output.split('\n').find((each) => each.includes('"path":"/api/v1/session"')) ?? '{}';
    expect(JSON.parse(line)).toMatchObject({ req: { method: 'POST' }, res: { statusCode: 401 } });
  });
});

/** A request whose body has begun to arrive: it is under way until `finish`. */
async function beginRequest(port: number) {
  const body = JSON.stringify({ email: 'nobody@larkmoor.example', password: 'x' });
  const socket = connect(port, '127.0.0.1');
  const head =
    `POST /api/v1/session HTTP/1.1\r\nHost: 127.0.0.1:${port}\r\nOrigin: http://127.0.0.1:${port}\r\n` +
    `Content-Type: application/json\r\nContent-Length: ${body.length}\r\n\r\n`;
  socket.write(head + body.slice(0, 5));
  socket.on('error', () => undefined);
  let said = '';
  socket.on('data', (text) => (said += text.toString()));
  const answer = new Promise<string>((resolve) => socket.on('close', () => resolve(said)));
  await wait(200);
  return { answer, finish: () => socket.write(body.slice(5)) };
}
