import { z } from 'zod';
import { Inbox } from './drop/inbox';
import { showLetters } from './drop/show-letters';
import { takeLetters } from './drop/take-letters';

const port = z.coerce.number().int().min(1).max(65535);
const Ports = z.object({ ELLWAND_MAIL_DROP_SMTP_PORT: port, ELLWAND_MAIL_DROP_HTTP_PORT: port });

/** The local mail drop, a process of its own: takes every letter that Ellwand sends, and shows it on a page. */
function openMailDrop(): void {
  const ports = Ports.safeParse(process.env);
  if (!ports.success) {
    fail(`The mail drop needs its ports: ${ports.error.issues.map(({ path }) => path.join('.')).join(', ')}`);
    return;
  }
  const inbox = new Inbox();
  const smtp = takeLetters(inbox);
  const pages = showLetters(inbox);
  smtp.on('error', (fault: Error) => fail(fault.message));
  pages.on('error', (fault: Error) => fail(fault.message));
  smtp.listen(ports.data.ELLWAND_MAIL_DROP_SMTP_PORT, '127.0.0.1');
  pages.listen(ports.data.ELLWAND_MAIL_DROP_HTTP_PORT, '127.0.0.1');
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, () => {
      pages.closeAllConnections();
      pages.close();
      smtp.close(() => process.exit(0));
    });
  }
}

function fail(sentence: string): void {
  process.stderr.write(`${sentence}\n`);
  process.exit(1);
}

openMailDrop();
