import { createTransport } from 'nodemailer';
import { freePort } from './harness/house';
import { Program } from './harness/program';

describe('the mail drop as a process', () => {
  it('takes letters, shows them, and stops when told to', async () => {
    const [smtp, http] = [await freePort(), await freePort()];
    const program = Program.run('mail/drop.ts', {
      ELLWAND_MAIL_DROP_SMTP_PORT: String(smtp),
      ELLWAND_MAIL_DROP_HTTP_PORT: String(http),
    });
    const inbox = () => fetch(`http://127.0.0.1:${http}/letters.json`);
    await program.until(() =>
      inbox().then(
        ({ ok }) => ok,
        () => false,
      ),
    );
    await createTransport({ host: '127.0.0.1', port: smtp }).sendMail({
      from: 'a@larkmoor.example',
      to: 'b@larkmoor.example',
      subject: 'Come',
      text: 'Today',
    });
    expect(await (await inbox()).json()).toMatchObject([{ to: ['b@larkmoor.example'], subject: 'Come' }]);
    program.child.kill('SIGTERM');
    expect(await program.ended()).toBe(0);
  });

  it('says in a sentence which ports it was not given', async () => {
    const program = Program.run('mail/drop.ts', { ELLWAND_MAIL_DROP_SMTP_PORT: '2525' });
    expect(await program.ended()).toBe(1);
    expect(program.output).toBe('The mail drop needs its ports: ELLWAND_MAIL_DROP_HTTP_PORT\n');
  });
});
