import type { AddressInfo } from 'node:net';
import { simpleParser, type ParsedMail } from 'mailparser';
import { SMTPServer } from 'smtp-server';

export interface Letter {
  /** The envelope's recipients: who would have got it, whatever the headers say. */
  readonly recipients: readonly string[];
  readonly mail: ParsedMail;
}

/** A real SMTP server on loopback that keeps what it is given; `refuse` makes it answer 451. */
export class MailSink {
  readonly letters: Letter[] = [];
  refuse = false;

  private readonly server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    onData: (stream, session, done) => {
      const recipients = session.envelope.rcptTo.map((to) => to.address);
      simpleParser(stream).then(
        (mail) => {
          if (this.refuse) return done(Object.assign(new Error('Later'), { responseCode: 451 }));
          this.letters.push({ recipients, mail });
          done();
        },
        (fault: unknown) => done(fault instanceof Error ? fault : new Error(String(fault))),
      );
    },
  });

  /** @returns the port it listens on, 127.0.0.1 */
  async open(): Promise<number> {
    await new Promise<void>((resolve) => this.server.listen(0, '127.0.0.1', resolve));
    return (this.server.server.address() as AddressInfo).port;
  }

  async close(): Promise<void> {
    await new Promise<void>((resolve) => this.server.close(resolve));
  }
}
