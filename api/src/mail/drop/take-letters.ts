import { type AddressObject, simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import type { Inbox } from './inbox';

const largestBytes = 1024 * 1024;

/** An SMTP server that keeps what it is given, and passes nothing on. */
export function takeLetters(inbox: Inbox): SMTPServer {
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    size: largestBytes,
    onData: (stream, session, done) => {
      const to = session.envelope.rcptTo.map(({ address }) => address);
      simpleParser(stream).then(
        ({ from, subject, text }) => {
          inbox.take({
            receivedAt: new Date(),
            from: senderOf(from),
            to,
            subject: subject ?? '(no subject)',
            text: text ?? '',
          });
          done();
        },
        (fault: unknown) => done(fault instanceof Error ? fault : new Error(String(fault))),
      );
    },
  });
}

const senderOf = (from: AddressObject | undefined): string => from?.text ?? 'unknown';
