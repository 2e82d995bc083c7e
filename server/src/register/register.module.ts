import { Module } from '@nestjs/common';
import { CertificatesModule } from '../certificates/certificates.module.ts';
import { ThrottlesModule } from '../throttles/throttles.module.ts';
import { FileChecksService } from './file-checks.service.ts';
import { RegisterController } from './register.controller.ts';
import { RegisterService } from './register.service.ts';

@Module({
  imports: [CertificatesModule, ThrottlesModule],
  controllers: [RegisterController],
  providers: [FileChecksService, RegisterService],
})
export class RegisterModule {}
