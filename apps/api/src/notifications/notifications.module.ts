import { Module } from '@nestjs/common';

import { MailService } from './mail.service.js';
import { Mailer } from './mailer.service.js';

@Module({ providers: [MailService, Mailer], exports: [MailService, Mailer] })
export class NotificationsModule {}
