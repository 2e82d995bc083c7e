import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { MailModule } from '../mail/mail.module.ts';
import { CertificateFilesRepository } from './certificate-files.repository.ts';
import { CertificateLetters } from './certificate-letters.ts';
import { CertificatesRepository } from './certificates.repository.ts';
import { CertificatesService } from './certificates.service.ts';
import { DrawingJobs, DrawingService } from './drawing.service.ts';
import { IssuersRepository } from './issuers.repository.ts';
import { SigningKeysService } from './keys/signing-keys.service.ts';
import { CertificateEventModel } from './models/certificate-event.model.ts';
import { CertificateFileModel } from './models/certificate-file.model.ts';
import { CertificateModel } from './models/certificate.model.ts';
import { DecisionModel } from './models/decision.model.ts';
import { IssuerCertificateModel } from './models/issuer-certificate.model.ts';

@Module({
  imports: [
    MailModule,
    SequelizeModule.forFeature([
      CertificateEventModel,
      CertificateFileModel,
      CertificateModel,
      DecisionModel,
      IssuerCertificateModel,
    ]),
  ],
  providers: [
    CertificateFilesRepository,
    CertificateLetters,
    CertificatesRepository,
    CertificatesService,
    DrawingJobs,
    DrawingService,
    IssuersRepository,
    SigningKeysService,
  ],
  exports: [CertificatesService],
})
export class CertificatesModule {}
