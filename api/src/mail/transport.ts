import { Inject, Injectable, type OnModuleDestroy } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { ENVIRONMENT } from '../common/environment.token';
import type { Environment } from '../config/environment';
import type { Letter } from './letter';

const patienceMs = 10_000;

/** The only place that knows nodemailer. */
@Injectable()
export class MailTransport implements OnModuleDestroy {
  private readonly transporter: Transporter;

  constructor(@Inject(ENVIRONMENT) private readonly environment: Environment) {
    this.transporter = createTransport({
      url: environment.smtpUrl,
      connectionTimeout: patienceMs,
      greetingTimeout: patienceMs,
      socketTimeout: patienceMs,
      disableFileAccess: true,
      disableUrlAccess: true,
    });
  }

  /** @param id stands in the Message-ID: a letter sent twice is seen as one */
  async send(id: string, letter: Letter): Promise<void> {
    const { mailFrom } = this.environment;
    await this.transporter.sendMail({
      messageId: `<${id}@${mailFrom.split('@')[1] ?? 'ellwand.invalid'}>`,
      // Objects, never text: in "a@b.example\r\nBcc: c@d.example" nodemailer would find a second recipient.
      from: { name: 'Ellwand', address: mailFrom },
      to: { name: '', address: letter.to },
      subject: letter.subject,
      text: letter.text,
      html: letter.html,
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
  }

  onModuleDestroy(): void {
    this.transporter.close();
  }
}
