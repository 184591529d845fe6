import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { MailTransport, smtpServer } from './mail-transport';
import { OutboxClaims } from './outbox-claims.service';
import { OutboxMailModel } from './outbox-mail.model';
import { OutboxPoller } from './outbox-poller.service';
import { OutboxSender } from './outbox-sender.service';
import { Outbox } from './outbox.service';

@Module({
  imports: [SequelizeModule.forFeature([OutboxMailModel])],
  providers: [
    Outbox,
    OutboxClaims,
    { provide: MailTransport, useFactory: () => new MailTransport(smtpServer()) },
    OutboxSender,
    OutboxPoller,
  ],
  exports: [Outbox, OutboxSender],
})
export class OutboxModule {}
