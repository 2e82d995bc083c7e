import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { MailModule } from '../mail/mail.module.ts';
import { CertificateFilesRepository } from './certificate-files.repository.ts';
import { CertificateLetters } from './certificate-letters.ts';
import { CertificateRecordsRepository } from './certificate-records.repository.ts';
import { CertificateRecordsService } from './certificate-records.service.ts';
import { CertificateViewsService } from './certificate-views.service.ts';
import { CertificatesController } from './certificates.controller.ts';
import { CertificatesRepository } from './certificates.repository.ts';
import { CertificatesService } from './certificates.service.ts';
import { DrawingJobs, DrawingService } from './drawing.service.ts';
import { IssuersRepository } from './issuers.repository.ts';
import { IssuingService } from './issuing.service.ts';
import { SigningKeysService } from './keys/signing-keys.service.ts';
import { CertificateEventModel } from './models/certificate-event.model.ts';
import { CertificateFileModel } from './models/certificate-file.model.ts';
import { CertificateModel } from './models/certificate.model.ts';
import { DecisionModel } from './models/decision.model.ts';
import { IssuerCertificateModel } from './models/issuer-certificate.model.ts';
import { NameCorrectionsService } from './name-corrections.service.ts';
import { OwnCertificatesController } from './own-certificates.controller.ts';
import { WithdrawalsService } from './withdrawals.service.ts';

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
  controllers: [CertificatesController, OwnCertificatesController],
  providers: [
    CertificateFilesRepository,
    CertificateLetters,
    CertificateRecordsRepository,
    CertificateRecordsService,
    CertificateViewsService,
    CertificatesRepository,
    CertificatesService,
    DrawingJobs,
    DrawingService,
    IssuersRepository,
    IssuingService,
    NameCorrectionsService,
    SigningKeysService,
    WithdrawalsService,
  ],
  exports: [CertificateRecordsService, CertificatesService],
})
export class CertificatesModule {}
