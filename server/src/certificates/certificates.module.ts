import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { CertificatesRepository } from './certificates.repository.ts';
import { CertificatesService } from './certificates.service.ts';
import { CertificateEventModel } from './models/certificate-event.model.ts';
import { CertificateModel } from './models/certificate.model.ts';
import { DecisionModel } from './models/decision.model.ts';

@Module({
  imports: [SequelizeModule.forFeature([CertificateEventModel, CertificateModel, DecisionModel])],
  providers: [CertificatesRepository, CertificatesService],
  exports: [CertificatesService],
})
export class CertificatesModule {}
