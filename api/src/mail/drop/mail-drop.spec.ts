import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { createTransport } from 'nodemailer';
import type { SMTPServer } from 'smtp-server';
import supertest from 'supertest';
import { Inbox } from './inbox';
import { showLetters } from './show-letters';
import { takeLetters } from './take-letters';

describe('the local mail drop', () => {
  let inbox: Inbox;
  let smtp: SMTPServer;
  let pages: Server;
  beforeEach(async () => {
    inbox = new Inbox();
    smtp = takeLetters(inbox);
    pages = showLetters(inbox);
    await new Promise<void>((resolve) => smtp.listen(0, '127.0.0.1', resolve));
  });
  afterEach(async () => {
    await new Promise<void>((resolve) => smtp.close(resolve));
    pages.close();
  });

  async function send(subject: string, text: string): Promise<void> {
    const { port } = smtp.server.address() as AddressInfo;
    const transport = createTransport({ host: '127.0.0.1', port });
    await transport.sendMail({ from: 'a@larkmoor.example', to: 'b@larkmoor.example', subject, text });
  }
  const get = (url: string) => supertest(pages).get(url).set('Host', '127.0.0.1:4326');

  it('shows a letter that was sent, its text as written and its link to click on', async () => {
    await send('Come <b>in</b>', 'By https://larkmoor.example/workroom/invitation#secret, today.');
    const list = await get('/');
    expect(list.text).toContain('Come &lt;b&gt;in&lt;/b&gt;');
    const address = /\/letters\/[\w-]+/.exec(list.text)?.[0] ?? '';
    const letter = await get(address);
    expect(letter.text).toContain('b@larkmoor.example');
    expect(letter.text).toContain('<a href="https://larkmoor.example/workroom/invitation#secret">');
    expect(letter.get('Content-Security-Policy')).toContain("default-src 'none'");
  });

  it('tells programs what has come', async () => {
    await send('First', 'one');
    await send('Second', 'two');
    const { body } = await get('/letters.json');
    expect(body).toMatchObject([
      { to: ['b@larkmoor.example'], subject: 'Second', text: 'two\n' },
      { subject: 'First' },
    ]);
  });

  it('keeps the latest 200 letters', () => {
    for (let count = 1; count <= 205; count++) {
      inbox.take({ receivedAt: new Date(), from: 'a', to: ['b'], subject: `Letter ${count}`, text: '' });
    }
    expect(inbox.all).toHaveLength(200);
    expect(inbox.all[0]?.subject).toBe('Letter 205');
    expect(inbox.all.at(-1)?.subject).toBe('Letter 6');
  });

  it('answers nobody who asks by another name', async () => {
    await send('Secret', 'link');
    const answer = await supertest(pages).get('/').set('Host', 'elsewhere.example');
    expect(answer.status).toBe(403);
    expect(answer.text).not.toContain('Secret');
  });

  it('says so where a letter is not there any more', async () => {
    expect((await get('/letters/gone')).status).toBe(404);
    expect((await get('/')).text).toContain('No letters yet');
  });
});
