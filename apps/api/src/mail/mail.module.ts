import { Global, Module } from '@nestjs/common';
import { MailService } from './mail.service';
import { MailTasks } from './mail.tasks';
import { MailTransport } from './transport';

@Global()
@Module({ providers: [MailService, MailTasks, MailTransport], exports: [MailService] })
export class MailModule {}
