import { Global, Module } from '@nestjs/common';
import { MailDispatcher } from './dispatcher.service';
import { MailSender } from './sender.service';
import { MailTransport } from './transport';

@Global()
@Module({ providers: [MailSender, MailDispatcher, MailTransport], exports: [MailSender, MailDispatcher] })
export class MailModule {}
