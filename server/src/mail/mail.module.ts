import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { MailSender } from './mail-sender.ts';
import { MailTransport } from './mail-transport.ts';
import { MailRepository } from './mail.repository.ts';
import { MailService } from './mail.service.ts';
import { MailMessageModel } from './models/mail-message.model.ts';

@Module({
  imports: [SequelizeModule.forFeature([MailMessageModel])],
  providers: [MailRepository, MailSender, MailService, MailTransport],
  exports: [MailService],
})
export class MailModule {}
