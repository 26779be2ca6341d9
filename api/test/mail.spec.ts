import { Work } from '../src/common/work';
import { MailDispatcher } from '../src/mail/dispatcher.service';
import { MailSender } from '../src/mail/sender.service';
import { MailTransport } from '../src/mail/transport';
import { type House, openHouse } from './harness/house';

const letter = {
  to: 'w.oddie@larkmoor.example',
  subject: 'Come',
  text: 'Secret link',
  html: '<p>Secret link</p>',
};

describe('the outbox', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  afterEach(() => house.empty());

  const send = () => house.app.get(Work).run((tx) => house.app.get(MailSender).send(tx, letter));
  const rows = () =>
    house.owner.source.query<
      { attempts: number; sent_at: Date | null; body_text: string; last_fault: string }[]
    >('SELECT * FROM ellwand.mail_outbox');

  it('sends nothing of a transaction that is taken back', async () => {
    const taken = house.app.get(Work).run(async (tx) => {
      await house.app.get(MailSender).send(tx, letter);
      throw new Error('taken back');
    });
    await expect(taken).rejects.toThrow('taken back');
    expect(await house.inbox()).toHaveLength(0);
  });

  it('forgets what the letter said once it is sent', async () => {
    await send();
    expect(await house.inbox()).toHaveLength(1);
    expect(await rows()).toMatchObject([{ attempts: 1, sent_at: expect.any(Date), body_text: '' }]);
  });

  it('tries again later where the mail server would not, with the same Message-ID', async () => {
    house.mail.refuse = true;
    await send();
    await house.inbox();
    expect(await rows()).toMatchObject([{ attempts: 1, sent_at: null, last_fault: 'EMESSAGE 451' }]);
    house.mail.refuse = false;
    expect(await house.inbox()).toHaveLength(0);
    house.clock.advance({ minutes: 1 });
    const [sent] = await house.inbox();
    const [row] = await house.owner.source.query<{ id: string }[]>('SELECT id FROM ellwand.mail_outbox');
    expect(sent?.mail.messageId).toBe(`<${row?.id ?? ''}@ellwand.invalid>`);
  });

  it('sends again what a process left claimed when it died, and not while it is claimed', async () => {
    await send();
    const claimedUntil = new Date(house.clock.now().getTime() + 60_000);
    await house.owner.source.query('UPDATE ellwand.mail_outbox SET attempts = 1, next_attempt_at = ?', [
      claimedUntil,
    ]);
    expect(await house.inbox()).toHaveLength(0);
    house.clock.advance({ minutes: 2 });
    expect(await house.inbox()).toHaveLength(1);
  });

  it('sends each letter once though several processes look at the same time', async () => {
    for (let count = 0; count < 6; count++) await send();
    const { app, clock } = house;
    const dispatchers = Array.from(
      { length: 4 },
      () => new MailDispatcher(app.get(Work), clock, app.get(MailTransport)),
    );
    await Promise.all(dispatchers.map((dispatcher) => dispatcher.dispatchDue()));
    expect(await house.inbox()).toHaveLength(6);
  });

  it.each(['a@b.example\r\nBcc: c@d.example', 'a@b.example,c@d.example', ''])(
    'takes no recipient but one address (ASVS 1.3.11): %j',
    async (to) => {
      const sending = house.app.get(Work).run((tx) => house.app.get(MailSender).send(tx, { ...letter, to }));
      await expect(sending).rejects.toThrow('Write one e-mail address');
    },
  );
});
